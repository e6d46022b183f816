import { rowLengthFeet, rowLengthMeters } from '@/lib/agronomy/row-length';
import { decimalText } from '@/lib/format/decimal-text';
import { rowLengthText } from '@/lib/format/row-length-text';
import { rowSpacingRule } from '@/lib/schemas/planting';
import { tryTexts } from '@/lib/texts/method-texts';
import type { TryDefinition } from './try-definition';
import { typedReading } from './typed-reading';

const texts = tryTexts.rowLength;

export const tryRowLength: TryDefinition = {
  id: 'row-length',
  title: texts.title,
  source: texts.source,
  fields: [{ key: 'spacing', label: texts.spacing, unit: 'in', kind: 'number', initial: '30' }],
  answer: (values) => {
    const inches = typedReading(values['spacing'] ?? '', 'spacing', rowSpacingRule, 'in');
    if (typeof inches !== 'number') return inches;
    const feet = rowLengthFeet(inches);
    return {
      kind: 'answer',
      text: rowLengthText(feet * 12, 'us'),
      detail: texts.detail(decimalText(feet, 3), decimalText(rowLengthMeters((inches * 2.54) / 100), 2)),
    };
  },
};
