/** The formulas that can be tried, in the order of the page. */
export const tryNames = ['spacing', 'plants-per-acre', 'late-plants', 'yield-grid', 'row-length', 'degree-days'] as const;
export type TryName = (typeof tryNames)[number];
