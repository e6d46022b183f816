/** What one published study says this stand loses. Studies are shown side by side and never added up. */
export type Penalty = {
  study: PenaltyStudy;
  /** The study by name and year, and where it was printed. */
  source: string;
  /** `read` in the source or an extension page that prints it; `quoted` in a page that quotes it. */
  reading: 'read' | 'quoted';
  /** The loss, low and high; equal where the study gives one figure. */
  lossLow: number;
  lossHigh: number;
  unit: LossUnit;
  /** `measured` at a point the study measured, `interpolated` between such points, or a `formula` of the source. */
  basis: 'measured' | 'interpolated' | 'formula';
  /** The column of the study that was read, in plain words; empty where there is only one. */
  column: string;
  /** What the study covered, in plain words. */
  domain: string;
};

/** `percent-of-even-stand`: of the yield of the same stand with no plant late. */
export type LossUnit =
  'percent-of-even-stand' | 'percent-of-three-plants' | 'percent-of-yield' | 'bushels-per-acre';

export const penaltyStudies = [
  'nafziger-1991',
  'liu-2004-late',
  'ontario-late',
  'ford-hicks-1992',
  'lawles-2012-irrigated',
  'lawles-2012-rainfed',
  'novak-ransom-2018-late',
  'novak-ransom-2018-skips',
  'carlson-doerge-clay',
  'nielsen-quoted',
  'nielsen-2004',
  'lauer-rankin-2004',
  'liu-2004-spacing',
] as const;

export type PenaltyStudy = (typeof penaltyStudies)[number];
