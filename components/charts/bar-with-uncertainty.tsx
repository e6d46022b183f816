import { scaleLinear } from 'd3-scale';
import { useId } from 'react';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { ChartFrame, type ChartNotes } from './chart-frame';

export type UncertainBar = {
  id: string;
  /** "Keep, 20,500 plants". */
  label: string;
  value: number;
  /** Equal to `upper` where no range is known; no line is drawn then. */
  lower: number;
  upper: number;
  /** "185 bu/ac", or "at most 120 bu/ac" where the table ends. */
  text: string;
  intervalText: string;
  /** The table ends here: the value is a bound, and the bar's end is drawn open. */
  isBound?: boolean;
  look: 'solid' | 'hatched';
};

type BarWithUncertaintyProps = ChartNotes & {
  bars: readonly UncertainBar[];
  unit: string;
  fileName: string;
};

const barHeight = 26;

/** A few amounts beside each other from zero, each with its uncertainty: what the stand makes, and what another would. */
export function BarWithUncertainty({ bars, unit, fileName, ...notes }: BarWithUncertaintyProps) {
  const texts = interfaceTexts.charts;
  // The same bars may stand twice on a page, frozen and as of now.
  const chartId = useId();
  const x = scaleLinear()
    .domain([0, Math.max(1, ...bars.map((bar) => Math.max(bar.value, bar.upper)))])
    .range([0, 98]);
  const percent = (value: number) => `${x(Math.max(0, value)).toFixed(2)}%`;
  return (
    <ChartFrame
      {...notes}
      unit={unit}
      fileName={fileName}
      columns={[
        { key: 'label', head: texts.choice },
        { key: 'value', head: unit, align: 'number' },
        { key: 'interval', head: texts.range, align: 'number' },
      ]}
      rows={bars.map((bar) => ({
        id: bar.id,
        cells: {
          label: { text: bar.label },
          value: { text: bar.text, sort: bar.value },
          interval: { text: bar.intervalText, sort: bar.lower },
        },
      }))}
    >
      <ul className="flex flex-col gap-4">
        {bars.map((bar) => (
          <li key={bar.id}>
            <span className="flex flex-wrap items-baseline justify-between gap-x-4 pb-1">
              <span className="text-15 font-bold">{bar.label}</span>
              <span className="font-mono text-15">
                {bar.text} <span className="text-13 text-ink-soft">{bar.intervalText}</span>
              </span>
            </span>
            <svg aria-hidden="true" width="100%" height={barHeight} className="block">
              <defs>
                <pattern
                  id={`${chartId}-${bar.id}`}
                  width={7}
                  height={7}
                  patternUnits="userSpaceOnUse"
                  patternTransform="rotate(45)"
                >
                  <rect width={7} height={7} className="fill-paper" />
                  <rect width={3} height={7} className="fill-series-3" />
                </pattern>
              </defs>
              <rect
                x={0}
                y={1}
                width={percent(bar.value)}
                height={barHeight - 2}
                strokeWidth={2}
                strokeDasharray={bar.isBound ? '5 4' : undefined}
                className={bar.look === 'solid' ? 'fill-series-2 stroke-series-2' : 'stroke-series-3'}
                fill={bar.look === 'solid' ? undefined : `url(#${chartId}-${bar.id})`}
                fillOpacity={bar.isBound ? 0.35 : 1}
              />
              {/* Ink over a halo of paper, so that the line shows on the bar and beside it. */}
              {(bar.lower < bar.upper ? (['stroke-paper', 'stroke-ink'] as const) : []).map((stroke) => (
                <g key={stroke} strokeWidth={stroke === 'stroke-paper' ? 6 : 2} className={stroke}>
                  <line
                    x1={percent(bar.lower)}
                    x2={percent(bar.upper)}
                    y1={barHeight / 2}
                    y2={barHeight / 2}
                  />
                  <line x1={percent(bar.lower)} x2={percent(bar.lower)} y1={7} y2={barHeight - 7} />
                  <line x1={percent(bar.upper)} x2={percent(bar.upper)} y1={7} y2={barHeight - 7} />
                </g>
              ))}
            </svg>
          </li>
        ))}
      </ul>
    </ChartFrame>
  );
}
