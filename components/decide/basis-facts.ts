import { areaText } from '@/lib/format/area-text';
import { dateText } from '@/lib/format/date-text';
import { intervalText } from '@/lib/format/interval-text';
import { moneyText } from '@/lib/format/money-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { readingText } from '@/lib/format/reading-text';
import { percentText } from '@/lib/format/percent-text';
import { unitName } from '@/lib/format/unit-name';
import { yieldText } from '@/lib/format/yield-text';
import type { ReplantBasis } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { decisionTexts } from '@/lib/texts/decision-texts';
import { replantSheetTexts } from '@/lib/texts/replant-sheet-texts';
import { replantTexts } from '@/lib/texts/replant-texts';
import { typedAmounts } from './typed-amounts';

export type BasisFact = { id: string; label: string; text: string };

/** What an answer rests on, as a flat list of named facts, so that two bases can be held beside each other. */
export function basisFacts(basis: ReplantBasis, units: UnitSystem): BasisFact[] {
  const texts = replantTexts.inputs;
  const fact = (id: string, label: string, text: string | null | undefined): BasisFact[] =>
    text ? [{ id, label, text }] : [];
  const number = (plantsPerAcre: number) =>
    plantsPerAreaText(plantsPerAcre, units, { nearest: 100, withUnit: false });
  const unit = unitName('plants-per-area', units);
  const interval = basis.stand?.interval;
  return [
    ...fact('planted', texts.planted, dateText(basis.plantedOn)),
    ...fact(
      'area',
      replantTexts.scope(basis.zone?.name ?? replantTexts.wholeField, null),
      basis.acres === null ? null : areaText(basis.acres, units),
    ),
    ...fact('stand', texts.stand, basis.stand && `${number(basis.stand.plantsPerAcre)} ${unit}`),
    ...fact(
      'interval',
      texts.interval,
      interval && intervalText(interval.lower, interval.upper, number, unit),
    ),
    ...basis.countedRows.flatMap((row) =>
      fact(
        `row ${row.rowSampleId}`,
        texts.row(row.label),
        `${plantsPerAreaText(row.plantsPerAcre, units)}, ${texts.seen(dateText(row.lastSeenOn, 'day-and-month'))}`,
      ),
    ),
    ...fact(
      'full-yield',
      texts.fullYield,
      basis.fullYield && yieldText(basis.fullYield.bushelsPerAcre, units),
    ),
    ...(basis.sheet ? sheetFacts(basis.sheet.inputs) : []),
  ];
}

function sheetFacts(inputs: NonNullable<ReplantBasis['sheet']>['inputs']): BasisFact[] {
  const texts = replantSheetTexts;
  const { typedIn } = inputs;
  const { price, costs, extraDrying, insurancePayment } = typedAmounts(inputs);
  const money = (amount: string | null) => (amount === null ? null : moneyText(amount, { decimals: 2 }));
  const percent = (amount: number | null) =>
    amount === null ? null : percentText(amount / 100, { decimals: 1 });
  const facts: [string, string, string | null][] = [
    ['price', texts.price[typedIn], money(price)],
    ['replant-on', texts.replantOn, inputs.replantOn && dateText(inputs.replantOn)],
    ['replant-stand', texts.replantStand, inputs.replantStand && readingText(inputs.replantStand)],
    ['poor-chance', texts.poorChance, percent(inputs.poorSecondStandChancePercent)],
    ['poor-yield', texts.poorYield, percent(inputs.poorSecondStandYieldPercent)],
    ...costs.map(({ label, amount }, index): [string, string, string | null] => [
      `cost ${index} ${label}`,
      label,
      money(amount),
    ]),
    ['drying', texts.extraDrying[typedIn], money(extraDrying)],
    ['insurance', texts.insurancePayment[typedIn], money(insurancePayment)],
    ['gap-loss', texts.gapLoss, percent(inputs.gapLossPercent)],
    ['uneven-loss', texts.unevenLoss, percent(inputs.unevenLossPercent)],
  ];
  return facts.flatMap(([id, label, text]) => (text === null ? [] : [{ id, label, text }]));
}

const shownMost = 8;

/** What differs between two bases, a sentence each; what was recorded anew with the same number is said as well. */
export function basisChanges(before: ReplantBasis, after: ReplantBasis, units: UnitSystem): string[] {
  const texts = decisionTexts;
  const [old, now] = [basisFacts(before, units), basisFacts(after, units)];
  const changes = [
    ...old.flatMap(({ id, label, text }) => {
      const found = now.find((each) => each.id === id);
      if (!found) return [texts.isGone(label, text)];
      return found.text === text ? [] : [texts.was(label, text, found.text)];
    }),
    ...now
      .filter(({ id }) => !old.some((each) => each.id === id))
      .map(({ label, text }) => texts.isNew(label, text)),
  ];
  if (changes.length === 0) return [texts.sameNumbers];
  const rest = changes.length - shownMost;
  return rest > 0 ? [...changes.slice(0, shownMost), texts.more(String(rest))] : changes;
}
