'use client';

import { usePlotArea, useYAxisScale } from 'recharts';
import { spreadLabels } from '@/components/ui/spread-labels';
import type { CurveSeries } from './curve-series';
import { seriesStyle } from './series-style';
import { wrappedLabel } from './wrapped-label';

type CurveEndLabelsProps = { series: readonly CurveSeries[]; scale: number; lineLength: number };

const lineHeight = 15;
const intervalStep = 7;
const intervalLeft = 5;
const leaderWidth = 16;
// A bold letter of 13 px is on average a little narrower than this.
const letterWidth = 7.6;

/** How much room right of the lines their intervals and names take. */
export function labelRoom(series: readonly CurveSeries[], lineLength: number): number {
  const lengths = series.flatMap((one) => wrappedLabel(one.label, lineLength)).map((line) => line.length);
  return intervalLeft + series.length * intervalStep + leaderWidth + Math.max(0, ...lengths) * letterWidth;
}

/** Each line's name beside its end, moved apart where lines end together, and the interval of its last value. */
export function CurveEndLabels({ series, scale, lineLength }: CurveEndLabelsProps) {
  const plot = usePlotArea();
  const yScale = useYAxisScale();
  if (!plot || !yScale) return null;
  const ends = series.flatMap((one) => {
    const last = one.points.at(-1);
    const y = last ? yScale(last.value * scale) : undefined;
    return y === undefined ? [] : [{ one, y, lines: wrappedLabel(one.label, lineLength) }];
  });
  const places = spreadLabels(
    ends.map((end) => end.y),
    ends.map((end) => end.lines.length * lineHeight + 3),
    plot.y - 10,
    plot.y + plot.height + 10,
  );
  const right = plot.x + plot.width;
  // The thin lines to the names start right of all intervals and so cannot cross each other.
  const leaderLeft = right + intervalLeft + ends.length * intervalStep;
  const labelLeft = leaderLeft + leaderWidth;
  return (
    <g>
      {ends.map(({ one, y, lines }, index) => {
        const { color } = seriesStyle(one.seriesIndex);
        const place = places[index] ?? y;
        const barX = right + intervalLeft + (index + 0.5) * intervalStep;
        const lower = one.lastInterval ? yScale(one.lastInterval.lower * scale) : undefined;
        const upper = one.lastInterval ? yScale(one.lastInterval.upper * scale) : undefined;
        return (
          <g key={one.id}>
            {lower === undefined || upper === undefined ? null : (
              <path
                d={`M${barX - 2.5} ${upper}h5m-2.5 0V${lower}m-2.5 0h5`}
                fill="none"
                stroke={color}
                strokeWidth={1.6}
              />
            )}
            <path
              d={`M${leaderLeft} ${y}L${labelLeft - 4} ${place}`}
              fill="none"
              stroke={color}
              strokeWidth={0.8}
              strokeDasharray="1.5 2.5"
            />
            <text fill={color} fontSize={13} fontWeight={700}>
              {lines.map((line, row) => (
                <tspan key={line} x={labelLeft} y={place + 4.5 + (row - (lines.length - 1) / 2) * lineHeight}>
                  {line}
                </tspan>
              ))}
            </text>
          </g>
        );
      })}
    </g>
  );
}
