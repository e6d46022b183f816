export type CurvePoint = {
  daysAfterPlanting: number;
  /** Plants per acre, or a share from 0 to 1, as the chart is told. */
  value: number;
};

export type CurveSeries = {
  id: string;
  label: string;
  /** Which color, dash and marker: the place of the setting in its trial, from 0. */
  seriesIndex: number;
  points: readonly CurvePoint[];
  /** The interval of the last point, drawn beside its end. */
  lastInterval?: { lower: number; upper: number };
};

export type CurveMeasure = 'plants-per-area' | 'share';
