import { describe, expect, it } from 'vitest';
import { curveRows } from '@/components/charts/curve-rows';
import { seriesMost, seriesStyle } from '@/components/charts/series-style';
import { wrappedLabel } from '@/components/charts/wrapped-label';

describe('the look of a series', () => {
  it('differs from every other in color, dash and marker, so that color is never needed', () => {
    const looks = Array.from({ length: seriesMost }, (_, index) => seriesStyle(index));
    for (const part of ['color', 'dash', 'marker'] as const)
      expect(new Set(looks.map((look) => look[part])).size, part).toBe(seriesMost);
  });

  it('throws for a seventh series instead of repeating a look', () => {
    expect(() => seriesStyle(6)).toThrow(RangeError);
  });
});

describe('the rows behind the curves', () => {
  it('leaves out the value of a setting on a day it was not visited', () => {
    const rows = curveRows(
      [
        {
          id: 'a',
          label: 'A',
          seriesIndex: 0,
          points: [
            { daysAfterPlanting: 9, value: 2 },
            { daysAfterPlanting: 8, value: 0 },
          ],
        },
        { id: 'b', label: 'B', seriesIndex: 1, points: [{ daysAfterPlanting: 9, value: 4 }] },
      ],
      10,
    );
    expect(rows).toEqual([
      { day: 8, values: { a: 0 } },
      { day: 9, values: { a: 20, b: 40 } },
    ]);
  });
});

describe('a label that is too long for one line', () => {
  it('breaks between words and keeps a long word whole', () => {
    expect(wrappedLabel('Pinned above the soil', 11)).toEqual(['Pinned', 'above the', 'soil']);
    expect(wrappedLabel('Floating', 4)).toEqual(['Floating']);
  });
});
