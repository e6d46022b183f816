import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { nafzigerYieldPercent, type StandDateReading } from '@/lib/agronomy/replant-table-nafziger';
import { decimalText } from '@/lib/format/decimal-text';
import { tryTexts } from '@/lib/texts/method-texts';
import type { TryAnswer, TryDefinition } from './try-definition';
import { typedNumber } from './typed-number';

const texts = tryTexts.grid;

export const tryYieldGrid: TryDefinition = {
  id: 'yield-grid',
  title: texts.title,
  source: texts.source,
  fields: [
    {
      key: 'month',
      label: texts.month,
      kind: 'choice',
      initial: '4',
      choices: Object.entries(texts.months).map(([value, label]) => ({ value, label })),
    },
    { key: 'day', label: texts.day, kind: 'number', initial: '30' },
    { key: 'plants', label: texts.plants, kind: 'number', initial: '20,000' },
  ],
  answer: (values) => {
    const day = typedNumber(values['day'] ?? '', { field: 'day', what: 'day of the month', least: 1, most: 31 });
    if (typeof day !== 'number') return day;
    const plants = typedNumber(values['plants'] ?? '', { field: 'plants', what: 'plants per acre', least: 0, most: 500_000 });
    if (typeof plants !== 'number') return plants;
    try {
      return answered(nafzigerYieldPercent({ month: Number(values['month']), day }, plants, 'day'));
    } catch (error) {
      if (!(error instanceof ImpossibleInput)) throw error;
      return { kind: 'wrong', field: 'day', message: texts.noSuchDay };
    }
  },
};

function answered(reading: StandDateReading): TryAnswer {
  const percent = `${decimalText(reading.percent, Number.isInteger(reading.percent) ? 0 : 1)} %`;
  const extrapolated = reading.extrapolatedInSource ? ` ${texts.extrapolated}` : '';
  if (reading.kind === 'at-most') {
    const ends = reading.beyond.map((end) => texts.beyond[end]).join('; ');
    return { kind: 'answer', text: texts.atMost(percent), detail: `${texts.boundWhy(ends)}${extrapolated}` };
  }
  const basis = texts.bases[reading.basis];
  return { kind: 'answer', text: texts.answer(percent), detail: `${basis.charAt(0).toUpperCase()}${basis.slice(1)}.${extrapolated}` };
}
