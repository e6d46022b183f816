import type { FormulaEntry, NumberInputFact } from '@/components/ui/number-source';
import { inferenceRegister } from '@/lib/agronomy/register-inference';
import { dateText } from '@/lib/format/date-text';
import { moneyPerAreaText } from '@/lib/format/money-per-area-text';
import { percentText } from '@/lib/format/percent-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { yieldText } from '@/lib/format/yield-text';
import type {
  ReadingOfTable,
  ReplantBasis,
  ReplantSpan,
  ReplantSumLine,
  ReplantValue,
} from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';
import type { SumLineProps } from './sum-line';

export type ShownLine = SumLineProps & { id: string };
type LineOf = Omit<SumLineProps, 'name' | 'inputs' | 'label'> & {
  id: string;
  label: string;
  inputs?: readonly NumberInputFact[];
};

export const entryOf = (id: string): FormulaEntry | undefined =>
  inferenceRegister.find((entry) => entry.id === id);
export const shownLine = ({ inputs = [], ...rest }: LineOf): ShownLine => ({
  ...rest,
  name: rest.label,
  inputs,
});

export type SumWords = ReturnType<typeof sumWords>;

/** How the numbers of one answer are written in one person's units, wherever in the sum they stand. */
export function sumWords(basis: ReplantBasis, answer: ReplantValue, units: UnitSystem) {
  const texts = replantTexts;
  const amount = (id: ReplantSumLine['id']): ReplantSpan =>
    answer.lines.find((each) => each.id === id)?.amount ?? { lower: 0, upper: 0 };
  const yieldOf = (bushelsPerAcre: number) =>
    yieldText(bushelsPerAcre, units, { decimals: units === 'us' ? 1 : 2 });
  return {
    basis,
    answer,
    units,
    amount,
    yieldOf,
    replantOn: basis.sheet?.inputs.replantOn ?? basis.plantedOn,
    fullYield: yieldOf(answer.terms.maximumYieldBushelsPerAcre),
    stand: (plantsPerAcre: number) => plantsPerAreaText(plantsPerAcre, units, { nearest: 100 }),
    dollars: (dollarsPerAcre: number, signed = true) =>
      moneyPerAreaText(dollarsPerAcre, units, { decimals: 2, signed, withUnit: false }),
    percent: (id: ReplantSumLine['id']) => percentText(amount(id).upper, { decimals: 1 }),
    typed: [{ name: texts.inputs.typed, text: texts.inputs.fromSheet }],
    /** A yield, or the most it can be where the table ends. */
    bounded: (span: ReplantSpan, reading: ReadingOfTable) =>
      reading.kind === 'at-most' ? texts.atMost(yieldOf(span.upper)) : yieldOf(span.upper),
    /** Of a span only the end that the table knows is worth printing; with both yields bounded there are two. */
    between: (span: ReplantSpan, text: (value: number) => string) => {
      if (span.lower === span.upper) return text(span.upper);
      if (answer.replantReading.kind === 'value') return texts.atLeast(text(span.lower));
      if (answer.keepReading.kind === 'value') return texts.atMost(text(span.upper));
      return texts.between(text(span.lower), text(span.upper));
    },
  };
}

/** What the table says for one day and stand, with how that was read off it. */
export function tableLine(id: string, day: string, reading: ReadingOfTable, stand: string): ShownLine {
  const texts = replantTexts.inputs;
  const percent = percentText(reading.percent / 100, { decimals: 1 });
  return shownLine({
    id,
    label: replantTexts.sum.tableShare(dateText(day, 'day-and-month')),
    text: reading.kind === 'at-most' ? replantTexts.atMost(percent) : percent,
    entry: entryOf('nafziger-1994'),
    inputs: [
      { name: texts.planted, text: dateText(day) },
      { name: texts.readFor, text: stand },
      { name: texts.reading, text: reading.kind === 'at-most' ? texts.atMost : texts[reading.basis] },
    ],
    ...(reading.extrapolatedInSource ? { note: replantTexts.rests.tableExtrapolated } : {}),
  });
}
