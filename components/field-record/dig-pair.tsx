import { TakeBack } from '@/components/count/take-back';
import { dateText } from '@/lib/format/date-text';
import { readingText } from '@/lib/format/reading-text';
import { fieldRecordTexts as texts } from '@/lib/texts/field-record-texts';
import { digTexts } from '@/lib/texts/round-dig-texts';
import { recordDay } from './record-day';
import type { DigRecord } from './record-types';

type Line = { name: string; say: (dig: DigRecord) => readonly string[] };

const said = (...words: (string | null)[]) => words.filter((word) => word !== null && word !== '') as string[];

const lines: readonly Line[] = [
  { name: texts.found, say: (dig) => dig.found.map((finding) => digTexts.findings[finding].found) },
  { name: texts.pointsTo, say: (dig) => dig.found.map((finding) => digTexts.findings[finding].pointsTo) },
  { name: texts.depth, say: (dig) => said(dig.depth && readingText(dig.depth)) },
  { name: texts.residue, say: (dig) => said(dig.residue && texts.residues[dig.residue]) },
  { name: texts.moisture, say: (dig) => said(dig.moisture && texts.moistures[dig.moisture]) },
  { name: texts.crust, say: (dig) => said(dig.crust && texts.crusts[dig.crust]) },
  { name: texts.place, say: (dig) => said(dig.placeTyped, texts.digWhere[dig.dugIn]) },
  { name: texts.note, say: (dig) => said(dig.note) },
];

/** A late plant beside its on-time neighbor, line by line: what differs between them is what tells. */
export function DigPair({ digs, plantedOn, mayWrite }: { digs: readonly DigRecord[]; plantedOn: string; mayWrite: boolean }) {
  const shown = lines.filter(({ say }) => digs.some((dig) => say(dig).length > 0));
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
            {shown.map(({ name, say }) => (
              <tr key={name} className="border-t border-rule">
                <th scope="row" className="py-1 pr-4 align-top font-normal">
                  {name}
                </th>
                {digs.map((dig) => (
                  <td key={dig.id} className="py-1 pr-4 align-top break-words whitespace-pre-line">
                    {(say(dig).length > 0 ? say(dig) : [texts.notLooked]).map((line) => (
                      <span key={line} className="block first-letter:uppercase">
                        {line}
                      </span>
                    ))}
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
