import { TakeBack } from '@/components/count/take-back';
import { dateText } from '@/lib/format/date-text';
import { readingText } from '@/lib/format/reading-text';
import { fieldRecordTexts as texts } from '@/lib/texts/field-record-texts';
import { digTexts } from '@/lib/texts/round-dig-texts';
import { recordDay } from './record-day';
import type { DigRecord } from './record-types';

type Line = { name: string; say: (dig: DigRecord) => string | null };

const lines: readonly Line[] = [
  { name: texts.found, say: (dig) => dig.found.map((finding) => digTexts.findings[finding].found).join('\n') || null },
  { name: texts.pointsTo, say: (dig) => dig.found.map((finding) => digTexts.findings[finding].pointsTo).join('\n') || null },
  { name: texts.depth, say: (dig) => (dig.depth ? readingText(dig.depth) : null) },
  { name: texts.residue, say: (dig) => (dig.residue ? texts.residues[dig.residue] : null) },
  { name: texts.moisture, say: (dig) => (dig.moisture ? texts.moistures[dig.moisture] : null) },
  { name: texts.crust, say: (dig) => (dig.crust ? texts.crusts[dig.crust] : null) },
  { name: texts.place, say: (dig) => [dig.placeTyped, texts.digWhere[dig.dugIn]].filter(Boolean).join(', ') },
  { name: texts.note, say: (dig) => dig.note },
];

/** A late plant beside its on-time neighbor, line by line: what differs between them is what tells. */
export function DigPair({ digs, plantedOn, mayWrite }: { digs: readonly DigRecord[]; plantedOn: string; mayWrite: boolean }) {
  const said = lines.filter(({ say }) => digs.some((dig) => say(dig) !== null));
  return (
    <li className="border-t border-rule py-2">
      <div className="overflow-x-auto">
        <table className="w-full max-w-reading table-fixed border-collapse text-left text-15">
          <thead>
            <tr>
              <td className="w-24 sm:w-32" />
              {digs.map((dig) => (
                <th key={dig.id} scope="col" className="py-1 pr-4 align-bottom font-bold">
                  {digTexts.plants[dig.plant]}
                  <span className="block font-normal">{recordDay(plantedOn, { on: dig.visitedOn, personName: dig.personName }).join(', ')}</span>
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {said.map(({ name, say }) => (
              <tr key={name} className="border-t border-rule">
                <th scope="row" className="py-1 pr-4 align-top font-normal">
                  {name}
                </th>
                {digs.map((dig) => (
                  <td key={dig.id} className="py-1 pr-4 align-top whitespace-pre-line">
                    {say(dig) ?? texts.notLooked}
                  </td>
                ))}
              </tr>
            ))}
            {mayWrite ? (
              <tr className="border-t border-rule">
                <td />
                {digs.map((dig) => (
                  <td key={dig.id} className="align-top">
                    <TakeBack targetKind="dig" targetId={dig.id} what={texts.digOf(digTexts.plants[dig.plant].toLowerCase(), dateText(dig.visitedOn))} />
                  </td>
                ))}
              </tr>
            ) : null}
          </tbody>
        </table>
      </div>
    </li>
  );
}
