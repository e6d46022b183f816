import { describe, expect, it } from 'vitest';
import { basisChanges } from '@/components/decide/basis-facts';
import { replantInputsSchema } from '@/lib/schemas/replant-sheet';
import type { ReplantBasis } from '@/lib/schemas/replant';

const inputs = replantInputsSchema.parse({
  fullYield: { typed: '200' },
  pricePerBushel: '4.00',
  replantOn: '2026-05-25',
  replantStand: { typed: '30,000' },
  costs: [{ label: 'Seed', dollarsPerAcre: '30' }],
  extraDryingPerAcre: '0',
  insurancePaymentPerAcre: '0',
  gapLossPercent: 0,
  unevenLossPercent: 0,
  poorSecondStandChancePercent: 0,
  poorSecondStandYieldPercent: null,
});
const row = (id: string, plantsPerAcre: number, countId: string) => ({
  rowSampleId: id,
  label: id,
  zoneName: null,
  plantsPerAcre,
  plantsHeld: plantsPerAcre / 1000,
  areaAcres: 0.001,
  lastSeenOn: '2026-05-18',
  countIds: [countId],
  tapeSheetId: null,
});
const basis: ReplantBasis = {
  plantingId: 'p',
  fieldName: 'Field',
  zone: null,
  crop: 'corn',
  plantedOn: '2026-04-30',
  acres: 62,
  countedRows: [row('R-1', 19_000, 'c1'), row('R-2', 21_000, 'c2')],
  stand: { plantsPerAcre: 20_000, interval: null, places: 'row-samples' },
  sheet: { id: 's', ofWholeField: true, inputs },
  fullYield: { bushelsPerAcre: 200, from: 'sheet' },
  answer: { kind: 'insufficient', gaps: [] },
  zoneAnswers: [],
  sentences: null,
  versions: {},
};

describe('what changed between two bases', () => {
  it('names each figure with what it was and what it is', () => {
    const after: ReplantBasis = {
      ...basis,
      sheet: { id: 't', ofWholeField: true, inputs: { ...inputs, pricePerBushel: '4.50' } as typeof inputs },
    };
    expect(basisChanges(basis, after, 'us')).toEqual(['Price, $ a bushel was $4.00, is $4.50 now.']);
  });

  it('names row samples that came, went or were counted again', () => {
    const after: ReplantBasis = {
      ...basis,
      countedRows: [row('R-1', 22_000, 'c3'), row('R-3', 18_000, 'c4')],
    };
    expect(basisChanges(basis, after, 'us')).toEqual([
      'Row sample R-1 was 19,000 plants per acre, seen 18 May, is 22,000 plants per acre, seen 18 May now.',
      'Row sample R-2 is gone; it was 21,000 plants per acre, seen 18 May.',
      'Row sample R-3 is new: 18,000 plants per acre, seen 18 May.',
    ]);
  });

  it('says so when something was recorded again with the same number', () => {
    expect(
      basisChanges(
        basis,
        { ...basis, countedRows: [row('R-1', 19_000, 'c9'), row('R-2', 21_000, 'c2')] },
        'metric',
      ),
    ).toEqual(['Something it rests on was made anew with the same numbers.']);
  });
});
