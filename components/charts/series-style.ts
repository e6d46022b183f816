export type MarkerKind = 'dot' | 'square' | 'triangle' | 'diamond' | 'ring' | 'cross';

export type SeriesStyle = { color: string; dash: string; marker: MarkerKind };

const styles: readonly SeriesStyle[] = [
  { color: 'var(--series-1)', dash: '2 4', marker: 'dot' },
  { color: 'var(--series-2)', dash: 'none', marker: 'square' },
  { color: 'var(--series-3)', dash: '9 5', marker: 'triangle' },
  { color: 'var(--series-4)', dash: '14 4 2 4', marker: 'diamond' },
  { color: 'var(--series-5)', dash: '5 3', marker: 'ring' },
  { color: 'var(--series-6)', dash: '16 6', marker: 'cross' },
];

/** How many settings can be told apart; a trial with more is shown as a table. */
export const seriesMost = styles.length;

/** The color, dash and marker of a setting: the same on every picture, so that no picture needs color alone. */
export function seriesStyle(index: number): SeriesStyle {
  const style = styles[index];
  if (!style) throw new RangeError(`There are ${seriesMost} series, from 0; ${index} is none of them.`);
  return style;
}
