import { carlsonDoergeClay } from '@/lib/agronomy/penalty/carlson-doerge-clay';
import { plantsHeld } from '@/lib/agronomy/plants-held';
import { spacingInchesMean, spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { plantsPerAcre } from '@/lib/agronomy/stand';
import { decimalText } from '@/lib/format/decimal-text';
import { outcomeText } from '@/lib/format/outcome-text';
import { percentText } from '@/lib/format/percent-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { spacingText } from '@/lib/format/spacing-text';
import { yieldText } from '@/lib/format/yield-text';
import { rowSpacingRule } from '@/lib/schemas/planting';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import { tryTexts } from '@/lib/texts/method-texts';
import type { TryAnswer, TryDefinition } from './try-definition';
import { typedReading } from './typed-reading';

const texts = tryTexts.spacing;

export const trySpacing: TryDefinition = {
  id: 'spacing',
  title: texts.title,
  source: texts.source,
  fields: [
    { key: 'readings', label: texts.readings, kind: 'lines', initial: '0 2 17 33 38 39 44 52 55 60 68' },
    {
      key: 'tape',
      label: texts.tape,
      kind: 'choice',
      initial: 'in',
      choices: Object.entries(texts.tapes).map(([value, label]) => ({ value, label })),
    },
    { key: 'spacing', label: texts.rowSpacing, unit: 'in', kind: 'number', initial: '30' },
  ],
  answer: (values) => {
    const tape = values['tape'] === 'cm' ? 'cm' : 'in';
    const places = typedPlaces(values['readings'] ?? '', tape);
    if (!Array.isArray(places)) return places;
    const rowSpacingInches = typedReading(values['spacing'] ?? '', 'spacing', rowSpacingRule, 'in');
    if (typeof rowSpacingInches !== 'number') return rowSpacingInches;
    const spacings = spacingsInches(places);
    const variation = spacingVariation(spacings);
    if (variation.kind === 'insufficient') return { kind: 'insufficient', text: tryTexts.needs(variation.needed, variation.had) };
    const { spacingInchesSd, spacingCv } = variation.value;
    const units = tape === 'cm' ? 'metric' : 'us';
    const mean = outcomeText(spacingInchesMean(spacings), (inches) => spacingText(inches, units));
    const sd = spacingText(spacingInchesSd, units);
    const loss = yieldText(carlsonDoergeClay(spacingInchesSd).lossLow, 'us', { decimals: 1 });
    return {
      kind: 'answer',
      text: texts.answer(mean, sd),
      facts: [
        { name: texts.loss, text: loss },
        { name: texts.cv, text: outcomeText(spacingCv, (cv) => percentText(cv)) },
        ...standFact(places, rowSpacingInches),
      ],
    };
  },
};

function typedPlaces(typed: string, tape: 'in' | 'cm'): number[] | TryAnswer {
  const places: number[] = [];
  for (const reading of typed.split(/[\s;]+/).filter(Boolean)) {
    const parsed = parseTapePlace(reading, tape);
    if (!parsed.ok) return { kind: 'wrong', field: 'readings', message: texts.wrongReading(reading) };
    const inches = placeInches(parsed.thousandths, tape);
    if (inches < (places.at(-1) ?? 0)) return { kind: 'wrong', field: 'readings', message: texts.order(reading) };
    places.push(inches);
  }
  return places;
}

/** From the first plant to the last, both ends are plants: the length holds one plant less than it shows. */
function standFact(places: readonly number[], rowSpacingInches: number) {
  const lengthInches = (places.at(-1) ?? 0) - (places[0] ?? 0);
  if (lengthInches <= 0) return [];
  const held = plantsHeld({ plantsUp: places.length, plantsDoubtful: 0, startEnd: 'plant', farEnd: 'plant' });
  const stand = plantsPerAcre({ plantsHeld: held, lengthInches, rowSpacingInches });
  return [{ name: texts.stand, text: texts.standText(plantsPerAreaText(stand, 'us', { withUnit: false }), decimalText(held, 0)) }];
}
