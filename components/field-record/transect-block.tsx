import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { percentText } from '@/lib/format/percent-text';
import { fieldRecordTexts as texts } from '@/lib/texts/field-record-texts';
import { RecordBlock } from './record-block';
import { recordDay } from './record-day';
import { RecordLine } from './record-line';
import type { PlantingRecordsData, TransectRecord } from './record-types';

/** Fewer places than this say nothing of a field: common practice, no source. */
const transectsLeast = 3;

/** Field cover, transect by transect, and over all marks read where there are enough of them. */
export function TransectBlock({ transects, plantedOn, mayWrite }: Pick<PlantingRecordsData, 'transects' | 'plantedOn' | 'mayWrite'>) {
  return (
    <RecordBlock title={texts.transects} records={transects.length} summary={<Summary transects={transects} />}>
      {transects.map((transect) => (
        <RecordLine
          key={transect.id}
          detail={[...(transect.stripNumber === null ? [] : [texts.inStrip(String(transect.stripNumber))]), ...recordDay(plantedOn, { on: transect.readOn, personName: transect.personName })]}
          takeBack={mayWrite ? { targetKind: 'field-transect', targetId: transect.id, what: texts.transectOf(dateText(transect.readOn)) } : undefined}
        >
          {texts.transect(String(transect.marksCovered), String(transect.marksRead), percentText(transect.marksCovered / transect.marksRead))}
        </RecordLine>
      ))}
    </RecordBlock>
  );
}

function Summary({ transects }: { transects: readonly TransectRecord[] }) {
  if (transects.length < transectsLeast) return <p className="text-15">{texts.transectsFew}</p>;
  const [read, covered] = [transects.reduce((sum, { marksRead }) => sum + marksRead, 0), transects.reduce((sum, { marksCovered }) => sum + marksCovered, 0)];
  const shares = transects.map(({ marksCovered, marksRead }) => marksCovered / marksRead);
  return (
    <p className="text-18">
      {texts.transectMean(percentText(covered / read), countText(transects.length, 'transect'))}. {texts.transectSpread(percentText(Math.min(...shares)), percentText(Math.max(...shares)))}
    </p>
  );
}
