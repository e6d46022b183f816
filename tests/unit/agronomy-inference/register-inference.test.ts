import { describe, expect, it } from 'vitest';
import { blockAnalysis } from '../../../lib/agronomy/inference/block-analysis';
import { holm } from '../../../lib/agronomy/inference/holm';
import { holmAgainstReference, tukeyPair } from '../../../lib/agronomy/inference/pairwise';
import { randomisationTest } from '../../../lib/agronomy/inference/randomisation-test';
import { smallestAttainableP } from '../../../lib/agronomy/layout';
import { inferenceRegister } from '../../../lib/agronomy/register-inference';
import type { WorkedExample } from '../../../lib/agronomy/register/register-entry';
import { breakEvenStand } from '../../../lib/agronomy/replant-break-even';
import { replantSum } from '../../../lib/agronomy/replant-sum';
import type { ReplantTerms } from '../../../lib/agronomy/replant-sum';
import { nafzigerYieldPercent } from '../../../lib/agronomy/replant-table-nafziger';
import { answered } from './reference-designs';

type Numbers = Record<string, number>;

function terms(inputs: Numbers, change: Partial<ReplantTerms> = {}): ReplantTerms {
  return {
    maximumYieldBushelsPerAcre: inputs.maximumYield as number,
    priceDollarsPerBushel: inputs.price ?? 4,
    plantedOn: { month: 4, day: 30 },
    gapLossShare: 0,
    unevenLossShare: 0,
    replantOn: { month: 5, day: 25 },
    replantPlantsPerAcre: inputs.replantPlantsPerAcre as number,
    poorSecondStandChance: 0,
    poorSecondStandYieldShare: 0,
    costs: [{ label: 'All', dollarsPerAcre: inputs.costs ?? 0 }],
    extraDryingDollarsPerAcre: 0,
    insurancePaymentDollarsPerAcre: 0,
    ...change,
  };
}

/** How each worked example is figured again by the code it explains. */
const again: Record<string, (inputs: WorkedExample['inputs']) => Numbers> = {
  'block-interval': (inputs) => {
    const strips = ['first', 'second'].flatMap((setting) =>
      (inputs[setting] as number[]).map((figure, index) => ({ block: `${index}`, setting, figure })),
    );
    const analysis = answered(blockAnalysis(strips));
    const [pair] = holmAgainstReference(analysis, 'second');
    if (!pair) throw new Error('no pair');
    return { ...pair, degreesOfFreedom: analysis.errorDegreesOfFreedom } as unknown as Numbers;
  },
  tukey: (inputs) => {
    const { difference, standardError, settings, degreesOfFreedom } = inputs as Numbers;
    const pair = {
      first: 'S',
      second: 'T',
      difference: difference as number,
      standardError: standardError as number,
    };
    return { p: tukeyPair(pair, settings as number, degreesOfFreedom as number).p };
  },
  holm: (inputs) => {
    const places = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth'];
    return Object.fromEntries(holm(inputs.p as number[]).map((p, index) => [places[index], p]));
  },
  'randomization-test': (inputs) => {
    const settings = inputs.settings as number;
    const strips = (inputs.figures as number[]).map((figure, index) => ({
      block: `${Math.floor(index / settings)}`,
      setting: `${index % settings}`,
      figure,
    }));
    return answered(randomisationTest(strips, 1)) as unknown as Numbers;
  },
  layout: (inputs) => ({
    smallestP: smallestAttainableP(inputs.settings as number, inputs.blocks as number),
  }),
  'nafziger-1994': (inputs) => {
    const { month, day, plantsPerAcre } = inputs as { month: number; day: number; plantsPerAcre: number };
    return { percent: nafzigerYieldPercent({ month, day }, plantsPerAcre).percent };
  },
  'keep-or-replant': (inputs) => {
    const sum = replantSum(terms(inputs as Numbers), inputs.plantsPerAcre as number);
    return {
      keepYield: sum.keepYieldBushelsPerAcre.upper,
      replantYield: sum.replantYieldBushelsPerAcre.upper,
    };
  },
  'break-even-stand': (inputs) => {
    const breakEven = breakEvenStand(terms(inputs as Numbers, { replantOn: { month: 6, day: 1 } }));
    return { plantsPerAcre: breakEven.kind === 'stand' ? breakEven.plantsPerAcre : Number.NaN };
  },
};

describe('inferenceRegister', () => {
  it.each(inferenceRegister.map((entry) => [entry.id, entry] as const))(
    'figures the example of %s again',
    (id, entry) => {
      const figured = again[id]?.(entry.workedExample.inputs) ?? {};
      for (const [name, expected] of Object.entries(entry.workedExample.expected)) {
        expect(Math.abs((figured[name] ?? Number.NaN) - expected), name).toBeLessThanOrEqual(
          entry.workedExample.tolerance,
        );
      }
    },
  );

  it('fills every field and uses every id once', () => {
    expect(new Set(inferenceRegister.map((entry) => entry.id)).size).toBe(inferenceRegister.length);
    for (const entry of inferenceRegister) {
      const { id, version, name, sentence, equation, source, domain, limits } = entry;
      for (const text of [id, version, name, sentence, equation, source, domain, limits])
        expect(text).not.toBe('');
    }
  });
});
