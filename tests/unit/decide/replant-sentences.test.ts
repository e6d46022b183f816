import { describe, expect, it } from 'vitest';
import type { ReplantTerms } from '@/lib/agronomy/replant-sum';
import type { ReplantBasis } from '@/lib/schemas/replant';
import { replantSentences } from '@/lib/server/services/replant/replant-sentences';
import { replantValue } from '@/lib/server/services/replant/replant-value';

/** Planted 30 April, 200 bu; replanted 25 May at 30,000: 92 % at 20,000 against 87 % (Purdue, from Nafziger 1994). */
const terms: ReplantTerms = {
  maximumYieldBushelsPerAcre: 200,
  priceDollarsPerBushel: 4,
  plantedOn: { month: 4, day: 30 },
  gapLossShare: 0,
  unevenLossShare: 0,
  replantOn: { month: 5, day: 25 },
  replantPlantsPerAcre: 30_000,
  poorSecondStandChance: 0,
  poorSecondStandYieldShare: 0,
  costs: [{ label: 'All', dollarsPerAcre: 40 }],
  extraDryingDollarsPerAcre: 0,
  insurancePaymentDollarsPerAcre: 0,
};
type Stand = NonNullable<ReplantBasis['stand']>;
const interval = { lower: 18_700, upper: 21_300, standardErrorPlantsPerAcre: 408, degreesOfFreedom: 3 };
const standOf = (plantsPerAcre: number, over: Stand['interval'] = null): Stand => ({
  plantsPerAcre,
  interval: over,
  places: 'row-samples',
});
const said = (
  stand: Stand,
  units: 'us' | 'metric',
  change: Partial<ReplantTerms> = {},
  acres: number | null = 62,
  zoneAnswers: ReplantBasis['zoneAnswers'] = [],
) =>
  replantSentences(
    { answer: replantValue({ ...terms, ...change }, stand, acres), acres, zoneAnswers },
    units,
  );

describe('the sentences of keep or replant', () => {
  it('give dollars an area and for the field, in the reader’s units', () => {
    // 10 bu × $4 + $40 = $80 an acre; / 0.404686 = $197.69 a hectare; × 62 = $4,960.
    expect(said(standOf(20_000), 'us').first).toBe(
      'Keep this stand. Replanting would lose about $80 an acre ($5,000 for the 62 acres).',
    );
    expect(said(standOf(20_000), 'metric').first).toBe(
      'Keep this stand. Replanting would lose about $198 a hectare ($5,000 for the 25.1 ha).',
    );
  });

  it('say the interval in plants per hectare, and that price, table and second stand are not in it', () => {
    const { sureness } = said(standOf(20_000, interval), 'metric');
    // 18,700 and 21,300 / 0.404686 = 46,209 and 52,633.
    expect(sureness[0]).toContain(
      'The count puts the stand at 46,200 to 52,600 plants per hectare (95 % interval).',
    );
    expect(sureness[1]).toMatch(/^The price, the yield table and the second stand are not in that/);
    expect(sureness.join(' ')).not.toMatch(/acre|bushel/);
  });

  it('bound in metric where the table ends in plants per acre', () => {
    // 10,000 / 0.404686 = 24,711 plants per hectare; 87 % less 68 % of 200 bu at $4, less $40, is $112 an acre, $277 a hectare.
    const { first, bound } = said(standOf(8_000), 'metric');
    expect(first).toBe(
      'Replant. It would gain at least $277 a hectare ($6,900 for the 25.1 ha) over keeping this stand.',
    );
    expect(bound).toContain(
      'its lowest stand is 24,700 plants per hectare, so keeping makes at most what is shown',
    );
  });

  it('leave the field out where its area is not known', () => {
    expect(said(standOf(20_000), 'metric', {}, null).first).toBe(
      'Keep this stand. Replanting would lose about $198 a hectare.',
    );
  });

  it('call a small difference too close, with what one percent of the table is worth', () => {
    // At 17,500 plants both make 87 %; 1 % of 200 bu at $4 is $8 an acre, $19.77 a hectare.
    const { first, sureness } = said(standOf(17_500), 'metric', { costs: [] });
    expect(first).toMatch(/^Too close to call\./);
    expect(sureness.join(' ')).toContain('One printed percent of the table is worth $20 a hectare here');
  });

  it('warn of a zone that says otherwise and of no other', () => {
    const zones: ReplantBasis['zoneAnswers'] = [
      {
        zoneId: 'a',
        name: 'Low corner',
        acres: 18,
        recommendation: 'replant',
        gainDollarsPerAcre: { lower: 112, upper: 112 },
      },
      {
        zoneId: 'b',
        name: 'High ground',
        acres: 44,
        recommendation: 'keep',
        gainDollarsPerAcre: { lower: -120, upper: -120 },
      },
      { zoneId: 'c', name: 'Ditch', acres: 1, recommendation: null, gainDollarsPerAcre: null },
    ];
    expect(said(standOf(20_000), 'us', {}, 62, zones).zones).toEqual([
      'In Low corner (18 acres) the answer is another: replanting there would gain about $112 an acre.',
    ]);
    expect(said(standOf(20_000), 'metric', {}, 62, zones).zones).toEqual([
      'In Low corner (7.3 ha) the answer is another: replanting there would gain about $277 a hectare.',
    ]);
  });

  it('say when no plausible count turns the answer, so that counting can stop', () => {
    expect(said(standOf(20_000, interval), 'us').sureness.at(-1)).toBe(
      'No stand inside that interval turns the answer, so counting can stop.',
    );
    const wide = { ...interval, lower: 14_000, upper: 26_000, standardErrorPlantsPerAcre: 1_886 };
    expect(said(standOf(20_000, wide), 'us').sureness.at(-1)).toMatch(
      /^Another stand inside that interval would turn the answer/,
    );
  });
});
