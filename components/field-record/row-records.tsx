import { Section } from '@/components/ui/section';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { fieldRecordTexts as texts } from '@/lib/texts/field-record-texts';
import { conditionText } from './condition-text';
import { DepthBlock } from './depth-block';
import { DigPair } from './dig-pair';
import { MarkerBlock } from './marker-block';
import { RecordBlock } from './record-block';
import { recordDay } from './record-day';
import { RecordLine } from './record-line';
import type { RowRecordsData } from './record-types';

/** What was recorded at a row sample beside counts, tape sheet and cover; nothing where nothing was. */
export function RowRecords({ records }: { records: RowRecordsData }) {
  const { depths, digPairs, crusts, markers, conditions, notes, plantedOn, mayWrite } = records;
  const recorded = depths.length + digPairs.length + crusts.length + markers.tallies.length + conditions.length + notes.length;
  if (recorded === 0) return null;
  return (
    <Section title={texts.section} lead={texts.sectionLead}>
      <DepthBlock depths={depths} plantedOn={plantedOn} mayWrite={mayWrite} />
      <RecordBlock title={texts.digs} records={digPairs.length} summary={<p className="text-15">{texts.keySuggests}</p>}>
        {digPairs.map(({ pairId, digs }) => (
          <DigPair key={pairId} digs={digs} plantedOn={plantedOn} mayWrite={mayWrite} />
        ))}
      </RecordBlock>
      <RecordBlock title={texts.crustSection} records={crusts.length}>
        {crusts.map((crust) => (
          <RecordLine
            key={crust.id}
            detail={recordDay(plantedOn, { on: crust.visitedOn, personName: crust.personName })}
            takeBack={mayWrite ? { targetKind: 'crust-reading', targetId: crust.id, what: texts.crustOf(dateText(crust.visitedOn)) } : undefined}
          >
            {texts.sprouts(countText(crust.sproutsSound, 'sound sprout'), String(crust.sproutsDead))}, {crust.crust === 'none' ? texts.noCrust : texts.crustIs(texts.crusts[crust.crust])}
          </RecordLine>
        ))}
      </RecordBlock>
      <MarkerBlock markers={markers} plantedOn={plantedOn} mayWrite={mayWrite} />
      <RecordBlock title={texts.conditions} records={conditions.length}>
        {conditions.map((condition) => (
          <RecordLine
            key={condition.id}
            detail={recordDay(plantedOn, { on: condition.observedOn, at: condition.observedAt, personName: condition.personName })}
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
            detail={recordDay(plantedOn, { on: note.notedOn, at: note.notedAt, personName: note.personName })}
            takeBack={mayWrite ? { targetKind: 'note', targetId: note.id, what: texts.noteOf(dateText(note.notedOn)) } : undefined}
          >
            {note.text}
          </RecordLine>
        ))}
      </RecordBlock>
    </Section>
  );
}
