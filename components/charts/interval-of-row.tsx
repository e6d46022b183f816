import type { IntervalRow } from './interval-plot';
import { SeriesMarker } from './series-marker';
import { seriesStyle } from './series-style';

type IntervalOfRowProps = {
  row: IntervalRow;
  interval: { estimate: number; lower: number; upper: number };
  percent: (value: number) => string;
};

const rowHeight = 40;
const middle = rowHeight / 2;

/** One difference: its numbers, and its bar across the line of no difference. */
export function IntervalOfRow({ row, interval, percent }: IntervalOfRowProps) {
  const { color } = seriesStyle(row.seriesIndex);
  return (
    <>
      <span className="font-mono text-15 @md:hidden">
        {row.text} <span className="text-13 text-ink-soft">{row.intervalText}</span>
      </span>
      <svg aria-hidden="true" width="100%" height={rowHeight} className="block overflow-visible">
        <line x1={percent(0)} x2={percent(0)} y1={0} y2="100%" strokeWidth={1.5} className="stroke-ink" />
        <line
          x1={percent(interval.lower)}
          x2={percent(interval.upper)}
          y1={middle}
          y2={middle}
          stroke={color}
          strokeWidth={3}
        />
        {[interval.lower, interval.upper].map((end, index) => (
          <line
            key={index}
            x1={percent(end)}
            x2={percent(end)}
            y1={middle - 6}
            y2={middle + 6}
            stroke={color}
            strokeWidth={2}
          />
        ))}
        <svg x={percent(interval.estimate)} y={middle} className="overflow-visible">
          <SeriesMarker index={row.seriesIndex} size={6} />
        </svg>
      </svg>
      <span className="hidden self-center text-right font-mono text-15 whitespace-nowrap @md:block">
        {row.text}
        <span className="block text-13 text-ink-soft">{row.intervalText}</span>
      </span>
    </>
  );
}
