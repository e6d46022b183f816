import { degreeDaysFahrenheit } from '@/lib/agronomy/degree-days';
import { decimalText } from '@/lib/format/decimal-text';
import { degreeDaysText } from '@/lib/format/degree-days-text';
import { tryTexts } from '@/lib/texts/method-texts';
import type { TryDefinition } from './try-definition';
import { typedNumber } from './typed-number';

const texts = tryTexts.degreeDays;
const limits = { least: -80, most: 140 };

export const tryDegreeDays: TryDefinition = {
  id: 'degree-days',
  title: texts.title,
  source: texts.source,
  fields: [
    { key: 'high', label: texts.high, unit: texts.unit, kind: 'number', initial: '80' },
    { key: 'low', label: texts.low, unit: texts.unit, kind: 'number', initial: '55' },
  ],
  answer: (values) => {
    const high = typedNumber(values['high'] ?? '', { field: 'high', what: texts.high.toLowerCase(), ...limits });
    if (typeof high !== 'number') return high;
    const low = typedNumber(values['low'] ?? '', { field: 'low', what: texts.low.toLowerCase(), ...limits });
    if (typeof low !== 'number') return low;
    if (high < low) return { kind: 'wrong', field: 'high', message: texts.highBelowLow };
    const plain = (degrees: number) => decimalText(degrees, Number.isInteger(degrees) ? 0 : 1);
    return {
      kind: 'answer',
      text: degreeDaysText(degreeDaysFahrenheit(high, low), 'us'),
      detail: texts.working(plain(high), plain(low)),
    };
  },
};
