import { describe, expect, it } from 'vitest';
import { drawShareText } from '@/lib/format/draw-share-text';
import { fieldMoneyText } from '@/lib/format/field-money-text';
import { priceText } from '@/lib/format/price-text';

describe('amounts of keep or replant', () => {
  it.each([
    [6039.4, '$6,000'],
    [412, '$410'],
    [-4960, '−$5,000'],
    [0, '$0'],
  ])('writes %d dollars for a field no finer than a sentence can know', (dollars, text) => {
    expect(fieldMoneyText(dollars)).toBe(text);
  });

  it('writes a price a bushel and a tonne', () => {
    // 1 Mg/ha of corn is 15.93 bu/ac, so a tonne is 15.93 / 0.404686 = 39.364 bu; × $4.20 = $165.33.
    expect(priceText(4.2, 'us')).toBe('$4.20 a bushel');
    expect(priceText(4.2, 'metric')).toBe('$165.33 a tonne');
  });

  it('says neither all nor none of the draws where a few were otherwise', () => {
    expect([0, 0.0025, 0.05, 0.9975, 1].map(drawShareText)).toEqual([
      '0 %',
      'less than 1 %',
      '5 %',
      'more than 99 %',
      '100 %',
    ]);
  });
});
