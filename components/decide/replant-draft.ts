import { z } from 'zod';
import { readingDraft, sentReading } from '@/components/form/reading-draft';
import { fullYieldRule } from '@/lib/schemas/planting';
import type { ReplantAnswer } from '@/lib/schemas/replant';
import { replantStandRule } from '@/lib/schemas/replant-sheet';
import { readingUnits, unitSystems, type ReadingUnit, type UnitSystem } from '@/lib/schemas/vocabulary';
import { replantSheetTexts } from '@/lib/texts/replant-sheet-texts';
import { typedAmounts } from './typed-amounts';

const readingDraftSchema = z.object({ typed: z.string(), unit: z.enum(readingUnits) });

/** The form while it is typed: texts only. `begunOn` is the sheet it was begun on, to tell when somebody saved another. */
export const replantDraftSchema = z.object({
  begunOn: z.string().nullable(),
  typedIn: z.enum(unitSystems),
  fullYield: readingDraftSchema,
  price: z.string(),
  replantOn: z.string(),
  replantStand: readingDraftSchema,
  costs: z.array(z.object({ label: z.string(), amount: z.string() })),
  extraDrying: z.string(),
  insurancePayment: z.string(),
  gapLoss: z.string(),
  unevenLoss: z.string(),
  poorChance: z.string(),
  poorYield: z.string(),
});
export type ReplantDraft = z.infer<typeof replantDraftSchema>;

const emptyAmounts = {
  price: null,
  costs: replantSheetTexts.suggestedCosts.map((label) => ({ label, amount: '' })),
  extraDrying: null,
  insurancePayment: null,
};

/** The standing figures as they were typed; before anybody typed any, empty places and names for the usual costs. */
export function standingDraft({ basis, plannedFullYield }: ReplantAnswer, units: UnitSystem): ReplantDraft {
  const inputs = basis.sheet?.inputs ?? null;
  const amounts = inputs ? typedAmounts(inputs) : emptyAmounts;
  const percent = (value: number | null | undefined, otherwise: string) =>
    value === null || value === undefined ? otherwise : String(value);
  const planned = plannedFullYield && {
    typed: plannedFullYield.typed,
    unit: plannedFullYield.unit as ReadingUnit,
  };
  return {
    begunOn: basis.sheet?.id ?? null,
    typedIn: inputs?.typedIn ?? units,
    fullYield: readingDraft(inputs?.fullYield ?? planned, fullYieldRule, units),
    price: amounts.price ?? '',
    replantOn: inputs?.replantOn ?? '',
    replantStand: readingDraft(inputs?.replantStand ?? null, replantStandRule, units),
    costs: amounts.costs,
    extraDrying: amounts.extraDrying ?? '',
    insurancePayment: amounts.insurancePayment ?? '',
    // Nothing lost to gaps or late plants is a figure like another: the stand already charges the missing plants.
    gapLoss: percent(inputs?.gapLossPercent, '0'),
    unevenLoss: percent(inputs?.unevenLossPercent, '0'),
    poorChance: percent(inputs?.poorSecondStandChancePercent, ''),
    poorYield: percent(inputs?.poorSecondStandYieldPercent, ''),
  };
}

/** The lines of cost that are sent: one without a name and an amount is no line. */
export const sentCosts = (draft: ReplantDraft) =>
  draft.costs.filter(({ label, amount }) => label.trim() !== '' || amount.trim() !== '');

/** The draft as the body of a sheet. What is no number goes out as it was typed, so that the answer names its field. */
export function sheetInputs(draft: ReplantDraft): Record<string, unknown> {
  const text = (typed: string) => (typed.trim() === '' ? null : typed);
  const shared = {
    typedIn: draft.typedIn,
    fullYield: sentReading(draft.fullYield),
    replantOn: text(draft.replantOn),
    replantStand: sentReading(draft.replantStand),
    gapLossPercent: percentOf(draft.gapLoss),
    unevenLossPercent: percentOf(draft.unevenLoss),
    poorSecondStandChancePercent: percentOf(draft.poorChance),
    poorSecondStandYieldPercent: percentOf(draft.poorYield),
  };
  return draft.typedIn === 'us'
    ? {
        ...shared,
        pricePerBushel: text(draft.price),
        costs: sentCosts(draft).map(({ label, amount }) => ({ label, dollarsPerAcre: amount })),
        extraDryingPerAcre: text(draft.extraDrying),
        insurancePaymentPerAcre: text(draft.insurancePayment),
      }
    : {
        ...shared,
        pricePerTonne: text(draft.price),
        costs: sentCosts(draft).map(({ label, amount }) => ({ label, dollarsPerHectare: amount })),
        extraDryingPerHectare: text(draft.extraDrying),
        insurancePaymentPerHectare: text(draft.insurancePayment),
      };
}

function percentOf(typed: string): number | string | null {
  const plain = typed.trim().replace(/\s*%$/, '').replace(',', '.');
  if (plain === '') return null;
  const amount = Number(plain);
  return Number.isFinite(amount) ? amount : typed;
}
