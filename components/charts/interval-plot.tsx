import { scaleLinear } from 'd3-scale';
import { decimalText } from '@/lib/format/decimal-text';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { ChartFrame, type ChartNotes } from './chart-frame';
import { IntervalOfRow } from './interval-of-row';

export type IntervalRow = {
  id: string;
  label: string;
  seriesIndex: number;
  /** Null where there is too little to say; `text` then says what is missing. */
  interval: { estimate: number; lower: number; upper: number } | null;
  /** The difference and its interval as they are said: "−1.5 days", "−2.2 to −0.8". */
  text: string;
  intervalText: string;
};

type IntervalPlotProps = ChartNotes & {
  rows: readonly IntervalRow[];
  /** The figure and its unit: "Spread, days, against raised". */
  unit: string;
  fileName: string;
};

/** Differences from the reference with their intervals, around a line where there is none. */
export function IntervalPlot({ rows, unit, fileName, ...notes }: IntervalPlotProps) {
  const texts = interfaceTexts.charts;
  const ends = rows.flatMap((row) => (row.interval ? [row.interval.lower, row.interval.upper] : []));
  const [least, most] = [Math.min(0, ...ends), Math.max(0, ...ends)];
  const domain = least === most ? [-1, 1] : [least, most];
  const x = scaleLinear().domain(domain).nice(4).range([3, 97]);
  const ticks = x.ticks(4);
  const percent = (value: number) => `${x(value).toFixed(2)}%`;
  const tickDecimals = decimalsOf(ticks);
  return (
    <ChartFrame
      {...notes}
      unit={unit}
      fileName={fileName}
      columns={[
        { key: 'label', head: texts.setting },
        { key: 'difference', head: texts.difference, align: 'number' },
        { key: 'interval', head: texts.interval, align: 'number' },
      ]}
      rows={rows.map((row) => ({
        id: row.id,
        cells: {
          label: { text: row.label },
          difference: { text: row.text, sort: row.interval?.estimate ?? null },
          interval: { text: row.intervalText, sort: row.interval?.lower ?? null },
        },
      }))}
    >
      <div className="@container">
        <ul className="grid grid-cols-1 @md:grid-cols-[minmax(6rem,10rem)_minmax(9rem,1fr)_auto] @md:gap-x-4">
          {rows.map((row) => (
            <li key={row.id} className="contents">
              <span className="pt-2 text-15 font-bold @md:self-center @md:pt-0">{row.label}</span>
              {row.interval ? (
                <IntervalOfRow row={row} interval={row.interval} percent={percent} />
              ) : (
                <span className="py-2 text-15 @md:col-span-2 @md:min-h-10">{row.text}</span>
              )}
            </li>
          ))}
          <li aria-hidden="true" className="contents">
            <span className="hidden @md:block" />
            <svg width="100%" height={44} className="block overflow-visible">
              <line x1="0" x2="100%" y1={1} y2={1} strokeWidth={1} className="stroke-rule" />
              <line x1={percent(0)} x2={percent(0)} y1={0} y2={7} strokeWidth={1.5} className="stroke-ink" />
              {ticks.map((tick) => (
                <text
                  key={tick}
                  x={percent(tick)}
                  y={20}
                  textAnchor="middle"
                  fontSize={13}
                  className="fill-ink-soft font-mono"
                >
                  {decimalText(tick, tickDecimals, { signed: true })}
                </text>
              ))}
              <text x={percent(0)} y={38} textAnchor={zeroAnchor(x(0))} fontSize={13} className="fill-ink">
                {texts.noDifference}
              </text>
            </svg>
            <span className="hidden @md:block" />
          </li>
        </ul>
      </div>
    </ChartFrame>
  );
}

/** As many decimals, up to two, as tell the ticks apart. */
function decimalsOf(ticks: readonly number[]): number {
  const isWhole = (factor: number) =>
    ticks.every((tick) => Math.abs(tick * factor - Math.round(tick * factor)) < 1e-9);
  if (isWhole(1)) return 0;
  return isWhole(10) ? 1 : 2;
}

/** The words under the zero line stay within the picture where the line stands near an edge. */
function zeroAnchor(percentAcross: number): 'start' | 'middle' | 'end' {
  if (percentAcross < 20) return 'start';
  return percentAcross > 80 ? 'end' : 'middle';
}
