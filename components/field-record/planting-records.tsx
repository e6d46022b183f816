import Link from 'next/link';
import { Section } from '@/components/ui/section';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { paths } from '@/lib/paths/paths';
import { fieldRecordTexts as texts } from '@/lib/texts/field-record-texts';
import { conditionText } from './condition-text';
import { RecordBlock } from './record-block';
import { recordDay } from './record-day';
import { RecordLine } from './record-line';
import type { PlantingRecordsData } from './record-types';
import { TransectBlock } from './transect-block';

type PlantingRecordsProps = { org: string; plantingId: string; records: PlantingRecordsData };

/** What was recorded of a planting as a whole; nothing where nothing was. */
export function PlantingRecords({ org, plantingId, records }: PlantingRecordsProps) {
  const { transects, conditions, notes, markersOut, plantedOn, mayWrite } = records;
  if (transects.length + conditions.length + notes.length + markersOut.length === 0) return null;
  const out = markersOut.reduce((sum, { left }) => sum + left, 0);
  const at = (row: { label: string } | null) => (row ? [row.label] : []);
  return (
    <Section title={texts.plantingSection} lead={texts.plantingSectionLead}>
      <RecordBlock
        title={texts.markers}
        records={markersOut.length}
        summary={<p className="text-15 font-bold text-flag-text">{texts.markersOut(countText(out, 'marker'), out === 1 ? 'is' : 'are', countText(markersOut.length, 'row sample'))}</p>}
      >
        {markersOut.map(({ id, label, left }) => (
          <li key={id} className="border-t border-rule">
            <Link className="flex min-h-press items-center gap-x-4 underline underline-offset-4" href={paths.rowSample(org, plantingId, id)}>
              {label}: {texts.markersOutOf(String(left))}
            </Link>
          </li>
        ))}
      </RecordBlock>
      <TransectBlock transects={transects} plantedOn={plantedOn} mayWrite={mayWrite} />
      <RecordBlock title={texts.conditions} records={conditions.length}>
        {conditions.map((condition) => (
          <RecordLine
            key={condition.id}
            detail={[...at(condition.row), ...recordDay(plantedOn, { on: condition.observedOn, at: condition.observedAt, personName: condition.personName })]}
            takeBack={mayWrite ? { targetKind: 'condition', targetId: condition.id, what: texts.conditionOf(dateText(condition.observedOn)) } : undefined}
          >
            {conditionText(condition)}
          </RecordLine>
        ))}
      </RecordBlock>
      <RecordBlock title={texts.notes} records={notes.length}>
        {notes.map((note) => (
          <RecordLine
            key={note.id}
            detail={[...at(note.row), ...recordDay(plantedOn, { on: note.notedOn, at: note.notedAt, personName: note.personName })]}
            takeBack={mayWrite ? { targetKind: 'note', targetId: note.id, what: texts.noteOf(dateText(note.notedOn)) } : undefined}
          >
            {note.text}
          </RecordLine>
        ))}
      </RecordBlock>
    </Section>
  );
}
