import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { decimalText } from '@/lib/format/decimal-text';
import { readingUnitText } from '@/lib/format/reading-unit-text';
import { fieldRecordTexts as texts } from '@/lib/texts/field-record-texts';
import { RecordBlock } from './record-block';
import { recordDay } from './record-day';
import { RecordLine } from './record-line';
import type { DepthRecord } from './record-types';

const decimals = { in: 2, cm: 1 } as const;

/** Seeding depths of a row sample: mean and range first, then each as it was read. */
export function DepthBlock({ depths, plantedOn, mayWrite }: { depths: readonly DepthRecord[]; plantedOn: string; mayWrite: boolean }) {
  return (
    <RecordBlock title={texts.depths} records={depths.length}>
      {depths.map((reading) => {
        const inUnit = (depth: number) => `${decimalText(depth, decimals[reading.unit])} ${readingUnitText(reading.unit)}`;
        return (
          <RecordLine
            key={reading.id}
            detail={[texts.depthsTyped(reading.typed.map((typed) => typed.replaceAll(' ', '\u00A0')).join(', ')), ...recordDay(plantedOn, { on: reading.visitedOn, personName: reading.personName })]}
            takeBack={mayWrite ? { targetKind: 'depth-reading', targetId: reading.id, what: texts.depthOf(dateText(reading.visitedOn)) } : undefined}
          >
            {texts.depthMean(inUnit(reading.mean), inUnit(reading.shallowest), inUnit(reading.deepest), countText(reading.plants, 'plant'))}
          </RecordLine>
        );
      })}
    </RecordBlock>
  );
}
