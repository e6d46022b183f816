'use client';

import { scaleLinear } from 'd3-scale';
import { CartesianGrid, Line, LineChart, XAxis, YAxis } from 'recharts';
import { decimalText } from '@/lib/format/decimal-text';
import { percentText } from '@/lib/format/percent-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { shownInUnits } from '@/lib/format/shown-in-units';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { ChartFrame, type ChartNotes } from './chart-frame';
import { CurveEndLabels, labelRoom } from './curve-end-labels';
import { curveRows } from './curve-rows';
import type { CurveMeasure, CurveSeries } from './curve-series';
import { SeriesMarker } from './series-marker';
import { seriesStyle } from './series-style';
import { useElementWidth } from './use-element-width';

type EmergenceCurvesProps = ChartNotes & {
  series: readonly CurveSeries[];
  measure: CurveMeasure;
  units: UnitSystem;
  fileName: string;
};

const narrowBelow = 560;

/** How the stand came up, day by day, one line a setting, each named at its end. */
export function EmergenceCurves({ series, measure, units, fileName, ...notes }: EmergenceCurvesProps) {
  const [box, width] = useElementWidth();
  const texts = interfaceTexts.charts;
  const isShare = measure === 'share';
  // Drawn as it is shown: percent, or thousands of plants in the person's own unit of area.
  const scale = isShare ? 100 : shownInUnits(1, 'plants-per-area', units) / 1000;
  const rows = curveRows(series, scale);
  const days = rows.map((row) => row.day);
  const tops = series.flatMap((one) => [
    ...one.points.map((point) => point.value * scale),
    (one.lastInterval?.upper ?? 0) * scale,
  ]);
  const yTicks = scaleLinear()
    .domain([0, Math.max(isShare ? 100 : 1, ...tops)])
    .nice(5)
    .ticks(5);
  const yTop = yTicks.at(-1) ?? 1;
  const [firstDay, lastDay] = [days[0] ?? 0, days.at(-1) ?? 1];
  const narrow = width < narrowBelow;
  const lineLength = narrow ? 11 : 24;
  const xTicks = scaleLinear()
    .domain([firstDay, lastDay])
    .ticks(Math.min(lastDay - firstDay, narrow ? 5 : 12))
    .filter(Number.isInteger);
  const valueText = (value: number) =>
    isShare ? percentText(value) : plantsPerAreaText(value, units, { nearest: 100, withUnit: false });

  return (
    <ChartFrame
      {...notes}
      unit={isShare ? texts.shareOfSeed : texts.thousandPlants(units)}
      fileName={fileName}
      columns={[
        { key: 'day', head: texts.dayAfterPlanting, align: 'number' },
        ...series.map((one) => ({ key: one.id, head: one.label, align: 'number' as const })),
      ]}
      rows={rows.map((row) => ({
        id: String(row.day),
        cells: {
          day: { text: decimalText(row.day, Number.isInteger(row.day) ? 0 : 1), sort: row.day },
          ...Object.fromEntries(
            series.map((one) => {
              const value = row.values[one.id];
              return [
                one.id,
                value === undefined
                  ? { text: texts.notVisited, sort: null }
                  : { text: valueText(value / scale), sort: value },
              ];
            }),
          ),
        },
      }))}
    >
      <div ref={box} className="h-80 w-full overflow-hidden" role="img" aria-label={notes.title}>
        {width > 0 ? (
          <LineChart
            data={rows}
            width={width}
            height={320}
            margin={{ top: 12, right: labelRoom(series, lineLength), bottom: 22, left: 0 }}
            accessibilityLayer={false}
          >
            <CartesianGrid vertical={false} stroke="var(--rule)" />
            <XAxis
              dataKey="day"
              type="number"
              domain={[firstDay, lastDay]}
              ticks={xTicks}
              interval={0}
              tickLine={false}
              stroke="var(--ink)"
              tick={{ fill: 'var(--ink-soft)', fontSize: 13, fontFamily: 'var(--font-numbers)' }}
              label={{
                value: texts.daysAfterPlanting,
                position: 'bottom',
                offset: 4,
                fill: 'var(--ink-soft)',
                fontSize: 13,
              }}
            />
            <YAxis
              type="number"
              domain={[0, yTop]}
              ticks={yTicks}
              width={40}
              axisLine={false}
              tickLine={false}
              tick={{ fill: 'var(--ink-soft)', fontSize: 13, fontFamily: 'var(--font-numbers)' }}
            />
            {series.map((one) => {
              const style = seriesStyle(one.seriesIndex);
              return (
                <Line
                  key={one.id}
                  dataKey={(row: (typeof rows)[number]) => row.values[one.id]}
                  name={one.label}
                  type="linear"
                  connectNulls
                  stroke={style.color}
                  strokeWidth={2.2}
                  strokeDasharray={style.dash}
                  isAnimationActive={false}
                  dot={(point) => (
                    <g key={point.index}>
                      {point.cx !== undefined && point.cy !== undefined && Number.isFinite(point.cy) ? (
                        <SeriesMarker index={one.seriesIndex} x={point.cx} y={point.cy} size={3.4} />
                      ) : null}
                    </g>
                  )}
                  activeDot={false}
                />
              );
            })}
            <CurveEndLabels series={series} scale={scale} lineLength={lineLength} />
          </LineChart>
        ) : null}
      </div>
    </ChartFrame>
  );
}
