import { plantsHeld, type RowEnd } from '@/lib/agronomy/plants-held';
import { plantsPerAcre } from '@/lib/agronomy/stand';
import { decimalText } from '@/lib/format/decimal-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { plantsMost } from '@/lib/schemas/observation';
import { rowSpacingRule } from '@/lib/schemas/planting';
import { rowLengthRule } from '@/lib/schemas/row-sample';
import { tryTexts } from '@/lib/texts/method-texts';
import type { TryDefinition } from './try-definition';
import { typedNumber } from './typed-number';
import { typedReading } from './typed-reading';

const texts = tryTexts.stand;

const ends: Record<string, [RowEnd, RowEnd]> = { marks: ['mark', 'mark'], mixed: ['mark', 'plant'], plants: ['plant', 'plant'] };

export const tryStand: TryDefinition = {
  id: 'plants-per-acre',
  title: texts.title,
  source: texts.source,
  fields: [
    { key: 'plants', label: texts.plants, kind: 'number', initial: '31' },
    { key: 'doubtful', label: texts.doubtful, kind: 'number', initial: '0' },
    { key: 'length', label: texts.length, unit: 'ft', kind: 'number', initial: '17 ft 5 in' },
    { key: 'spacing', label: texts.spacing, unit: 'in', kind: 'number', initial: '30' },
    {
      key: 'ends',
      label: texts.ends,
      kind: 'choice',
      initial: 'marks',
      choices: Object.entries(texts.endChoices).map(([value, label]) => ({ value, label })),
    },
  ],
  answer: (values) => {
    const plants = typedNumber(values['plants'] ?? '', { field: 'plants', what: texts.plants.toLowerCase(), least: 0, most: plantsMost });
    if (typeof plants !== 'number') return plants;
    const doubtful = typedNumber(values['doubtful'] ?? '', { field: 'doubtful', what: 'doubtful plants', least: 0 });
    if (typeof doubtful !== 'number') return doubtful;
    if (doubtful > plants) return { kind: 'wrong', field: 'doubtful', message: texts.moreDoubtful };
    const lengthInches = typedReading(values['length'] ?? '', 'length', rowLengthRule, 'in');
    if (typeof lengthInches !== 'number') return lengthInches;
    const rowSpacingInches = typedReading(values['spacing'] ?? '', 'spacing', rowSpacingRule, 'in');
    if (typeof rowSpacingInches !== 'number') return rowSpacingInches;
    const [startEnd, farEnd] = ends[values['ends'] ?? 'marks'] ?? ['mark', 'mark'];
    const held = plantsHeld({ plantsUp: plants, plantsDoubtful: doubtful, startEnd, farEnd });
    const stand = plantsPerAcre({ plantsHeld: held, lengthInches, rowSpacingInches });
    return {
      kind: 'answer',
      text: plantsPerAreaText(stand, 'us'),
      detail: texts.detail(
        decimalText(held, Number.isInteger(held) ? 0 : 1),
        plantsPerAreaText(stand, 'metric', { withUnit: false }),
      ),
    };
  },
};
