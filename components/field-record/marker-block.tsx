import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { fieldRecordTexts as texts } from '@/lib/texts/field-record-texts';
import { RecordBlock } from './record-block';
import { recordDay } from './record-day';
import { RecordLine } from './record-line';
import type { RowRecordsData } from './record-types';

/** Markers set and taken up; what is left in the row is flagged, because the next machine runs over it. */
export function MarkerBlock({ markers, plantedOn, mayWrite }: Pick<RowRecordsData, 'markers' | 'plantedOn' | 'mayWrite'>) {
  const { left, takenUp, tallies } = markers;
  return (
    <RecordBlock
      title={texts.markers}
      records={tallies.length}
      summary={
        left > 0 ? (
          <p className="text-15 font-bold text-flag-text">{texts.markersLeft(countText(left, 'marker'), left === 1 ? 'is' : 'are')}</p>
        ) : takenUp === null ? null : (
          <p className="text-15">{texts.markersAllUp}</p>
        )
      }
    >
      {tallies.map((tally) => (
        <RecordLine
          key={tally.id}
          detail={recordDay(plantedOn, { on: tally.happenedOn, personName: tally.personName })}
          takeBack={mayWrite ? { targetKind: 'marker-tally', targetId: tally.id, what: texts.markerOf(texts.events[tally.event], dateText(tally.happenedOn)) } : undefined}
        >
          {countText(tally.markers, 'marker')} {texts.events[tally.event]}
        </RecordLine>
      ))}
    </RecordBlock>
  );
}
