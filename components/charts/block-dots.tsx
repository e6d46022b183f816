import { scaleLinear } from 'd3-scale';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { ChartFrame, type ChartNotes } from './chart-frame';
import { SeriesMarker } from './series-marker';
import { seriesStyle } from './series-style';

export type BlockDot = { seriesIndex: number; value: number; text: string };
export type BlockOfDots = { id: string; label: string; dots: readonly BlockDot[] };
export type DotSeries = { seriesIndex: number; label: string };

type BlockDotsProps = ChartNotes & {
  blocks: readonly BlockOfDots[];
  series: readonly DotSeries[];
  unit: string;
  tickText: (value: number) => string;
  fileName: string;
};

const rowHeight = 34;
const firstRow = 20;
const axisHeight = 30;

/** One line a block, one mark a strip: whether the settings keep their order on each ground. */
export function BlockDots({ blocks, series, unit, tickText, fileName, ...notes }: BlockDotsProps) {
  const texts = interfaceTexts.charts;
  const values = blocks.flatMap((block) => block.dots.map((dot) => dot.value));
  const x = scaleLinear()
    .domain(values.length > 0 ? [Math.min(...values), Math.max(...values)] : [0, 1])
    .nice(5)
    .range([4, 96]);
  const ticks = x.ticks(5);
  const percent = (value: number) => `${x(value).toFixed(2)}%`;
  const yOf = (index: number) => firstRow + index * rowHeight;
  const bottom = yOf(blocks.length - 1) + rowHeight / 2;
  return (
    <ChartFrame
      {...notes}
      unit={unit}
      fileName={fileName}
      columns={[
        { key: 'block', head: texts.block },
        ...series.map((one) => ({ key: String(one.seriesIndex), head: one.label, align: 'number' as const })),
      ]}
      rows={blocks.map((block) => ({
        id: block.id,
        cells: {
          block: { text: block.label },
          ...Object.fromEntries(
            block.dots.map((dot) => [String(dot.seriesIndex), { text: dot.text, sort: dot.value }]),
          ),
        },
      }))}
    >
      <div className="grid grid-cols-[4.5rem_1fr]" role="img" aria-label={notes.title}>
        <ul aria-hidden="true" style={{ paddingTop: firstRow - rowHeight / 2 }}>
          {blocks.map((block) => (
            <li key={block.id} className="flex items-center text-15" style={{ height: rowHeight }}>
              {block.label}
            </li>
          ))}
        </ul>
        <svg aria-hidden="true" width="100%" height={bottom + axisHeight} className="block overflow-visible">
          {ticks.map((tick) => (
            <g key={tick}>
              <line x1={percent(tick)} x2={percent(tick)} y1={4} y2={bottom} strokeWidth={1} className="stroke-rule" />
              <text x={percent(tick)} y={bottom + 18} textAnchor="middle" fontSize={13} className="fill-ink-soft font-mono">
                {tickText(tick)}
              </text>
            </g>
          ))}
          {series.map(({ seriesIndex }) => {
            const { color, dash } = seriesStyle(seriesIndex);
            const path = blocks.flatMap((block, index) =>
              block.dots.filter((dot) => dot.seriesIndex === seriesIndex).map((dot) => ({ index, value: dot.value })),
            );
            return path.slice(1).map((to, step) => {
              const from = path[step];
              // A line across a block without this setting would say that it was there.
              if (!from || to.index !== from.index + 1) return null;
              return (
                <line
                  key={`${seriesIndex} ${to.index}`}
                  x1={percent(from.value)}
                  x2={percent(to.value)}
                  y1={yOf(from.index)}
                  y2={yOf(to.index)}
                  stroke={color}
                  strokeWidth={1.6}
                  strokeDasharray={dash}
                />
              );
            });
          })}
          {blocks.flatMap((block, index) =>
            block.dots.map((dot, place) => (
              <svg key={`${block.id} ${place}`} x={percent(dot.value)} y={yOf(index)} className="overflow-visible">
                <SeriesMarker index={dot.seriesIndex} size={5} />
              </svg>
            )),
          )}
        </svg>
      </div>
    </ChartFrame>
  );
}
