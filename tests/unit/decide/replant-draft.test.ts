import { describe, expect, it } from 'vitest';
import { sheetInputs, type ReplantDraft } from '@/components/decide/replant-draft';
import { replantInputsSchema } from '@/lib/schemas/replant-sheet';

const draft: ReplantDraft = {
  begunOn: null,
  typedIn: 'metric',
  fullYield: { typed: '12,6', unit: 't/ha' },
  price: '165',
  replantOn: '2026-05-25',
  replantStand: { typed: '74000', unit: 'per-ha' },
  costs: [
    { label: 'Seed', amount: '75,50' },
    { label: '', amount: '' },
  ],
  extraDrying: '0',
  insurancePayment: '',
  gapLoss: '2,5 %',
  unevenLoss: '0',
  poorChance: '15',
  poorYield: '',
};

describe('the form of the replant sheet', () => {
  it('sends what was typed in metric and leaves an empty place empty', () => {
    const parsed = replantInputsSchema.parse(sheetInputs(draft));
    expect(parsed).toMatchObject({
      typedIn: 'metric',
      pricePerTonne: '165',
      costs: [{ label: 'Seed', dollarsPerHectare: '75.50' }],
      insurancePaymentPerHectare: null,
      gapLossPercent: 2.5,
      poorSecondStandYieldPercent: null,
      fullYield: { typed: '12,6', unit: 't/ha', thousandths: 12_600 },
    });
  });

  it('sends letters as they are, so that the field is named and nothing is swallowed', () => {
    const parsed = replantInputsSchema.safeParse(
      sheetInputs({ ...draft, gapLoss: 'few', poorYield: 'half', extraDrying: 'some', poorChance: '' }),
    );
    expect(parsed.error?.issues.map((issue) => issue.path.join('.')).sort()).toEqual([
      'extraDryingPerHectare',
      'gapLossPercent',
      'poorSecondStandChancePercent',
      'poorSecondStandYieldPercent',
    ]);
  });

  it('takes a sheet that does not say its units as bushels and acres', () => {
    const { typedIn: _typedIn, ...older } = replantInputsSchema.parse(
      sheetInputs({ ...draft, typedIn: 'us', price: '4', costs: [] }),
    );
    expect(_typedIn).toBe('us');
    expect(replantInputsSchema.parse(older).typedIn).toBe('us');
  });
});
