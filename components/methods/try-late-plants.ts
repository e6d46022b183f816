import { nafziger1991, type PatternRead } from '@/lib/agronomy/penalty/nafziger-1991';
import { decimalText } from '@/lib/format/decimal-text';
import { tryTexts } from '@/lib/texts/method-texts';
import type { TryDefinition } from './try-definition';
import { typedNumber } from './typed-number';

const texts = tryTexts.late;
const patterns: readonly PatternRead[] = ['alternating', 'in-groups', 'not-known'];

export const tryLatePlants: TryDefinition = {
  id: 'late-plants',
  title: texts.title,
  source: texts.source,
  fields: [
    { key: 'share', label: texts.share, unit: '%', kind: 'number', initial: '25' },
    { key: 'days', label: texts.days, unit: 'days', kind: 'number', initial: '11' },
    {
      key: 'pattern',
      label: texts.pattern,
      kind: 'choice',
      initial: 'alternating',
      choices: patterns.map((pattern) => ({ value: pattern, label: texts.patterns[pattern] })),
    },
  ],
  answer: (values) => {
    const share = typedNumber(values['share'] ?? '', { field: 'share', what: 'share of late plants', least: 0, most: 100 });
    if (typeof share !== 'number') return share;
    const delayDays = typedNumber(values['days'] ?? '', { field: 'days', what: 'days', least: 0, most: 365 });
    if (typeof delayDays !== 'number') return delayDays;
    const pattern = patterns.find((each) => each === values['pattern']) ?? 'not-known';
    const said = nafziger1991({ lateShare: share / 100, delayDays }, pattern);
    if (said.kind === 'insufficient') return { kind: 'insufficient', text: tryTexts.needs(said.needed, said.had) };
    const { lossLow, lossHigh, basis } = said.value;
    const [low, high] = [decimalText(100 - lossHigh, 1), decimalText(100 - lossLow, 1)];
    return {
      kind: 'answer',
      text: texts.answer(low === high ? `${low} %` : `${low} to ${high} %`),
      detail: texts.bases[basis],
    };
  },
};
