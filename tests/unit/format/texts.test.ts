import { describe, expect, it } from 'vitest';
import { insufficient, value } from '@/lib/agronomy/outcome';
import { areaText } from '@/lib/format/area-text';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { daysText } from '@/lib/format/days-text';
import { decimalText } from '@/lib/format/decimal-text';
import { degreeDaysText } from '@/lib/format/degree-days-text';
import { intervalText } from '@/lib/format/interval-text';
import { lengthText } from '@/lib/format/length-text';
import { moneyPerAreaText } from '@/lib/format/money-per-area-text';
import { moneyText } from '@/lib/format/money-text';
import { outcomeText } from '@/lib/format/outcome-text';
import { pValueText } from '@/lib/format/p-value-text';
import { percentText } from '@/lib/format/percent-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { rowLengthText } from '@/lib/format/row-length-text';
import { spacingText } from '@/lib/format/spacing-text';
import { yieldText } from '@/lib/format/yield-text';

describe('a decimal number', () => {
  it.each([
    [30747.5, 0, '30,748'],
    [0.05, 1, '0.1'],
    [-0.3, 1, '\u22120.3'],
    [-0, 0, '0'],
    [-0.04, 1, '0.0'],
    [1e15, 0, '1,000,000,000,000,000'],
  ])('writes %d with %d decimals as %s', (number, decimals, text) => {
    expect(decimalText(number, decimals)).toBe(text);
  });

  it('puts a plus before a difference above zero and nothing before zero', () => {
    expect(decimalText(1.5, 1, { signed: true })).toBe('+1.5');
    expect(decimalText(-0.01, 1, { signed: true })).toBe('0.0');
  });

  it.each([Number.NaN, Infinity, -Infinity])('throws for %d instead of printing it', (number) => {
    expect(() => decimalText(number, 0)).toThrow(RangeError);
    expect(() => rowLengthText(number, 'us')).toThrow(RangeError);
    expect(() => moneyText(number)).toThrow(RangeError);
    expect(() => percentText(number)).toThrow(RangeError);
  });
});

// Conversions: foot 0.3048 m, inch 2.54 cm, acre 43,560 square feet (exact); 15.93 bu/ac of corn in 1 Mg/ha (given).
describe('quantities in both unit systems', () => {
  it('shows plants by the acre and the hectare', () => {
    expect(plantsPerAreaText(30748.2, 'us')).toBe('30,748 plants per acre');
    // 30,748.2 / 0.40468564224 = 75,980.4.
    expect(plantsPerAreaText(30748.2, 'metric')).toBe('75,980 plants per hectare');
    expect(plantsPerAreaText(30748.2, 'us', { nearest: 100, withUnit: false })).toBe('30,700');
    expect(plantsPerAreaText(30748.2, 'metric', { nearest: 100, withUnit: false })).toBe('76,000');
  });

  it('shows lengths, spacings and rows', () => {
    expect(lengthText(68, 'us')).toBe('68.0 in');
    expect(lengthText(68, 'metric')).toBe('172.7 cm');
    expect(spacingText(6.8, 'us')).toBe('6.8 in');
    expect(spacingText(5.1, 'metric', { withUnit: false })).toBe('13.0');
    expect(rowLengthText(209.088, 'us')).toBe('17 ft 5 in');
    expect(rowLengthText(209.088, 'metric')).toBe('5.31 m');
    expect(rowLengthText(119.7, 'us')).toBe('10 ft');
    expect(rowLengthText(11.2, 'us')).toBe('11 in');
    expect(rowLengthText(-0.2, 'us')).toBe('0 in');
  });

  it('shows areas with a tenth only where there is one', () => {
    expect(areaText(62, 'us')).toBe('62 acres');
    expect(areaText(1, 'us')).toBe('1 acre');
    expect(areaText(12.5, 'us')).toBe('12.5 acres');
    expect(areaText(62, 'metric')).toBe('25.1 ha');
  });

  it('shows yields', () => {
    expect(yieldText(184, 'us')).toBe('184 bu/ac');
    expect(yieldText(12.53, 'us', { decimals: 1 })).toBe('12.5 bu/ac');
    expect(yieldText(15.93, 'metric')).toBe('1.0 t/ha');
  });

  it('shows degree days', () => {
    expect(degreeDaysText(17.5, 'us')).toBe('17.5 °F degree days');
    expect(degreeDaysText(18, 'metric')).toBe('10.0 °C degree days');
  });
});

describe('money', () => {
  it('puts the minus before the dollar and drops it at zero', () => {
    expect(moneyText('-97.40')).toBe('\u2212$97');
    expect(moneyText('-0.20')).toBe('$0');
    expect(moneyText('4.2', { decimals: 2 })).toBe('$4.20');
    expect(moneyText(1234567)).toBe('$1,234,567');
    expect(moneyText(10, { signed: true })).toBe('+$10');
  });

  it('shows money by the acre and the hectare', () => {
    expect(moneyPerAreaText('97.4', 'us')).toBe('$97 per acre');
    // 97.4 / 0.40468564224 = 240.68.
    expect(moneyPerAreaText('97.4', 'metric')).toBe('$241 per hectare');
  });

  it.each(['', 'abc', '1,5', '1e3', 'NaN'])('throws for the amount "%s"', (amount) => {
    expect(() => moneyText(amount)).toThrow(RangeError);
    expect(() => moneyPerAreaText(amount, 'metric')).toThrow(RangeError);
  });
});

describe('shares, days, counts and p', () => {
  it('shows a share as percent', () => {
    expect(percentText(0.9044)).toBe('90 %');
    expect(percentText(0.9044, { decimals: 1 })).toBe('90.4 %');
    expect(percentText(0.125, { withUnit: false })).toBe('13');
  });

  it('says one day and many days', () => {
    expect(daysText(2.94)).toBe('2.9 days');
    expect(daysText(1)).toBe('1.0 days');
    expect(daysText(1, { decimals: 0 })).toBe('1 day');
    expect(daysText(-1.5, { signed: true })).toBe('\u22121.5 days');
  });

  it('counts whole things only', () => {
    expect(countText(1, 'plant')).toBe('1 plant');
    expect(countText(1200, 'line')).toBe('1,200 lines');
    expect(() => countText(1.5, 'plant')).toThrow(RangeError);
  });

  it('never shows a p of zero', () => {
    expect(pValueText(0.0309)).toBe('p = 0.03');
    expect(pValueText(0.0042)).toBe('p = 0.004');
    expect(pValueText(0.00001)).toBe('p less than 0.001');
    expect(pValueText(1)).toBe('p = 1.00');
    expect(() => pValueText(1.1)).toThrow(RangeError);
  });
});

describe('dates', () => {
  it('writes the local day as it stands', () => {
    expect(dateText('2026-05-07')).toBe('7 May 2026');
    expect(dateText('2026-05-07', 'day-and-month')).toBe('7 May');
    // 18 May 2026 is a Monday.
    expect(dateText('2026-05-18', 'with-weekday')).toBe('Monday 18 May 2026');
    expect(dateText('2024-02-29')).toBe('29 February 2024');
  });

  it.each(['2026-02-30', '2026-13-01', '7 May 2026', '', '2026-05-07T00:00:00Z'])(
    'throws for "%s"',
    (text) => {
      expect(() => dateText(text)).toThrow(RangeError);
    },
  );
});

describe('intervals and outcomes', () => {
  it('says the unit of an interval once', () => {
    expect(intervalText(28100, 31900, (n) => decimalText(n, 0))).toBe('28,100 to 31,900');
    expect(intervalText(0.8, 2.2, (n) => decimalText(n, 1), 'days')).toBe('0.8 to 2.2 days');
    expect(() => intervalText(2, 1, String)).toThrow(RangeError);
  });

  it('says in words what an insufficient answer needed and had', () => {
    expect(outcomeText(value(0.5), (share) => percentText(share))).toBe('50 %');
    expect(outcomeText(insufficient('too-few-spacings', '2 spacings', '1'), String)).toBe(
      'not enough yet: needs 2 spacings, has 1',
    );
  });
});
