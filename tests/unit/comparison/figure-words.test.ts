import { describe, expect, it } from 'vitest';
import { figureWords } from '@/components/comparison/figure-words';
import { differencesFromReference } from '@/components/comparison/main-figure';
import { comparedFigures } from '@/lib/schemas/comparison';

describe('how compared figures are written', () => {
  it('gives each difference its own unit', () => {
    expect(figureWords('spread-days', 'us').amount(-1.5)).toBe('1.5 days');
    expect(figureWords('spread-days', 'us').amount(1)).toBe('1.0 day');
    expect(figureWords('late-share', 'us').amount(0.041)).toBe('4.1 percentage points');
    expect(figureWords('score', 'us').amount(12.4)).toBe('12 points');
    expect(figureWords('plants-per-acre', 'us').signed(-1267)).toBe('−1,300 plants per acre');
  });

  it('converts before it rounds for a reader of hectares and centimeters', () => {
    expect(figureWords('plants-per-acre', 'metric').amount(1267)).toBe('3,100 plants per hectare');
    expect(figureWords('spacing-sd', 'metric').amount(1)).toBe('2.5 cm');
  });

  it('does not round an interval that leaves zero out onto zero', () => {
    expect(figureWords('spread-days', 'us').range(0.04, 2.79)).toBe('0.04 to 2.79 days');
    expect(figureWords('spread-days', 'us').signedRange(-2.79, -0.04)).toBe('−2.79 to −0.04');
    expect(figureWords('spread-days', 'us').signedRange(-2.1, 0.7)).toBe('−2.1 to +0.7');
    expect(figureWords('spread-days', 'us').range(0, 2)).toBe('0.0 to 2.0 days');
  });

  it('has words for every figure that is compared', () => {
    for (const figure of comparedFigures) {
      const words = figureWords(figure, 'us');
      expect(words.mean(0.5)).not.toBe('');
      expect(words.head && words.name && words.better && words.unit).toBeTruthy();
    }
  });

  it('turns a pair that was worked out from the reference’s side', () => {
    const pair = { first: 'raised', second: 'floating', difference: 1.5, lower: 0.4, upper: 2.6, p: 0.01, toldApart: true };
    const other = { ...pair, first: 'pinned', second: 'floating' };
    const comparison = { figure: 'spread-days' as const, strips: [], means: [], analysis: { kind: 'insufficient' as const, reason: '', needed: '', had: '' }, differences: [pair, other] };
    expect(differencesFromReference(comparison, 'raised')).toEqual([{ settingId: 'floating', difference: -1.5, lower: -2.6, upper: -0.4 }]);
  });
});
