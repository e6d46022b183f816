import { scaleLinear } from 'd3-scale';
import { decimalText } from '@/lib/format/decimal-text';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { ChartFrame, type ChartNotes } from './chart-frame';

export type CountedDay = {
  /** Whole calendar days, ascending. */
  daysAfterPlanting: number;
  /** Plants up so far; null on a day nobody looked, drawn as a dash, which is not the same as none. */
  count: number | null;
  isToday?: boolean;
};

type DayBarsProps = ChartNotes & {
  days: readonly CountedDay[];
  /** Seeds planted along this row; null where the seeding rate is not known. */
  seeds: number | null;
  fileName: string;
};

const plotTop = 34;
const plotHeight = 110;
const height = plotTop + plotHeight + 42;

/** One row, day by day: how many were up, under the line of the seeds that were planted. */
export function DayBars({ days, seeds, fileName, ...notes }: DayBarsProps) {
  const texts = interfaceTexts.charts;
  const firstDay = days[0]?.daysAfterPlanting ?? 0;
  const lastDay = days.at(-1)?.daysAfterPlanting ?? firstDay;
  // Every calendar day has its place, so that a day nobody looked is seen as one.
  const slots = Array.from({ length: lastDay - firstDay + 1 }, (_, index): CountedDay => {
    const daysAfterPlanting = firstDay + index;
    return (
      days.find((day) => day.daysAfterPlanting === daysAfterPlanting) ?? { daysAfterPlanting, count: null }
    );
  });
  const y = scaleLinear()
    .domain([0, Math.max(1, seeds ?? 0, ...days.map((day) => day.count ?? 0))])
    .range([plotHeight, 0]);
  const slot = 100 / Math.max(slots.length, 4);
  const across = (index: number, share: number) => `${((index + share) * slot).toFixed(2)}%`;
  return (
    <ChartFrame
      {...notes}
      unit={texts.plantsUpSoFar}
      fileName={fileName}
      columns={[
        { key: 'day', head: texts.dayAfterPlanting, align: 'number' },
        { key: 'count', head: texts.plantsUpSoFar, align: 'number' },
      ]}
      rows={days.map((day) => ({
        id: String(day.daysAfterPlanting),
        cells: {
          day: { text: decimalText(day.daysAfterPlanting, 0), sort: day.daysAfterPlanting },
          count: {
            text: day.count === null ? texts.notVisited : decimalText(day.count, 0),
            sort: day.count,
          },
        },
      }))}
    >
      <svg role="img" aria-label={notes.title} width="100%" height={height} className="block max-w-xl">
        {seeds === null ? null : (
          <>
            <line
              x1={0}
              x2="100%"
              y1={plotTop + y(seeds)}
              y2={plotTop + y(seeds)}
              strokeWidth={1.5}
              strokeDasharray="3 4"
              className="stroke-ink"
            />
            <text x={0} y={plotTop + y(seeds) - 20} fontSize={13} className="fill-ink font-mono">
              {texts.seedsPlanted(decimalText(seeds, 0))}
            </text>
          </>
        )}
        {slots.map((day, index) => {
          const top = plotTop + y(day.count ?? 0);
          return (
            <g key={day.daysAfterPlanting}>
              {day.count === null ? (
                <text
                  x={across(index, 0.5)}
                  y={plotTop + plotHeight - 5}
                  textAnchor="middle"
                  fontSize={13}
                  className="fill-ink-soft font-mono"
                >
                  –
                </text>
              ) : (
                <>
                  <rect
                    x={across(index, 0.12)}
                    y={top}
                    width={`${(slot * 0.76).toFixed(2)}%`}
                    height={plotTop + plotHeight - top}
                    className={day.isToday ? 'fill-flag' : 'fill-ink'}
                  />
                  {/* The count stands over its bar on a halo of paper, so that the line of seeds never cuts it. */}
                  <text
                    x={across(index, 0.5)}
                    y={top - 5}
                    textAnchor="middle"
                    fontSize={13}
                    strokeWidth={5}
                    paintOrder="stroke"
                    className={`stroke-paper font-mono ${day.isToday ? 'fill-flag-text font-bold' : 'fill-ink'}`}
                  >
                    {decimalText(day.count, 0)}
                  </text>
                </>
              )}
              <text
                x={across(index, 0.5)}
                y={plotTop + plotHeight + 18}
                textAnchor="middle"
                fontSize={13}
                className={`font-mono ${day.isToday ? 'fill-ink font-bold' : 'fill-ink-soft'}`}
              >
                {decimalText(day.daysAfterPlanting, 0)}
              </text>
            </g>
          );
        })}
        <line
          x1={0}
          x2="100%"
          y1={plotTop + plotHeight}
          y2={plotTop + plotHeight}
          strokeWidth={1}
          className="stroke-ink"
        />
        <text x={0} y={height - 6} fontSize={13} className="fill-ink-soft">
          {texts.daysAfterPlanting}
        </text>
      </svg>
    </ChartFrame>
  );
}
