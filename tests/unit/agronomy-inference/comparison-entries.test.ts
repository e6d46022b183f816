import { describe, expect, it } from 'vitest';
import { changingHours } from '../../../lib/agronomy/changing-hours';
import { blockAnalysis } from '../../../lib/agronomy/inference/block-analysis';
import { blocksNeeded } from '../../../lib/agronomy/inference/blocks-needed';
import { pooledDifference } from '../../../lib/agronomy/inference/pooled-difference';
import { residueAgainstTiming } from '../../../lib/agronomy/inference/residue-against-timing';
import { rowUnitEffects } from '../../../lib/agronomy/inference/row-unit-effects';
import { settingByEnvironment } from '../../../lib/agronomy/inference/setting-by-environment';
import { smallestDifference } from '../../../lib/agronomy/inference/smallest-difference';
import { stripSdOfTrials } from '../../../lib/agronomy/inference/strip-sd-of-trials';
import { trialPower } from '../../../lib/agronomy/inference/trial-power';
import { inferenceRegister } from '../../../lib/agronomy/register-inference';
import { comparisonEntries } from '../../../lib/agronomy/register/comparison-entries';
import type { WorkedExample } from '../../../lib/agronomy/register/register-entry';
import { splitPlanterLayout } from '../../../lib/agronomy/split-planter-layout';
import { answered } from './reference-designs';

type Inputs = WorkedExample['inputs'];
const one = (inputs: Inputs, name: string) => inputs[name] as number;
const many = (inputs: Inputs, name: string) => inputs[name] as readonly number[];

/** Figures block by block, settings numbered from 1. */
function strips(figures: readonly number[], settings: number) {
  return figures.map((figure, index) => ({
    block: `${Math.floor(index / settings)}`,
    setting: `${(index % settings) + 1}`,
    figure,
  }));
}

function twoYears(inputs: Inputs) {
  return ['figures', 'figuresNext'].flatMap((name) =>
    strips(many(inputs, name), one(inputs, 'settings')).map((strip) => ({ ...strip, environment: name })),
  );
}

/** How each worked example is figured again by the code it explains. */
const again: Record<string, (inputs: Inputs) => Record<string, number>> = {
  'least-squares-mean': (inputs) => {
    const { means, meanSquareError } = answered(
      blockAnalysis(strips(many(inputs, 'figures'), one(inputs, 'settings'))),
    );
    const [first, second, third] = means.map((mean) => mean.leastSquaresMean) as [number, number, number];
    return { first, second, third, standardError: means[0]?.standardError ?? Number.NaN, meanSquareError };
  },
  'pooled-difference': (inputs) => {
    const { difference, forOthers, forThese } = answered(pooledDifference(twoYears(inputs), '4', '1'));
    const { lower, upper } = answered(forOthers);
    return {
      difference,
      lower,
      upper,
      theseLower: answered(forThese).lower,
      theseUpper: answered(forThese).upper,
    };
  },
  'setting-by-environment': (inputs) => {
    const { interaction, settingsAgainstInteraction } = answered(settingByEnvironment(twoYears(inputs)));
    return {
      interactionF: interaction.fRatio,
      interactionP: interaction.p,
      settingF: settingsAgainstInteraction.fRatio,
      settingP: settingsAgainstInteraction.p,
    };
  },
  'row-unit': (inputs) => {
    const figures = strips(many(inputs, 'figures'), one(inputs, 'rowUnits')).map(
      ({ block, setting, figure }) => ({
        strip: block,
        setting: 'one',
        rowUnit: Number(setting),
        figure,
      }),
    );
    const found = answered(rowUnitEffects(figures)).rowUnits.find(
      ({ rowUnit }) => rowUnit === one(inputs, 'rowUnit'),
    );
    return found as unknown as Record<string, number>;
  },
  'residue-and-timing': (inputs) => {
    const found = answered(
      residueAgainstTiming(
        ['first', 'second', 'third'].flatMap((block) =>
          many(inputs, block).map((timingDays, index) => ({
            block,
            timingDays,
            inRowCoverPercent: many(inputs, 'covers')[index] as number,
          })),
        ),
      ),
    );
    return { slope: found.daysPerTenPoints, lower: found.lower, upper: found.upper };
  },
  'smallest-difference': (inputs) => {
    const trial = {
      settings: one(inputs, 'settings'),
      blocks: one(inputs, 'blocks'),
      stripSd: one(inputs, 'stripSd'),
      test: 'holm' as const,
    };
    return {
      difference: answered(smallestDifference(trial)).difference,
      power: trialPower(trial, one(inputs, 'difference')),
    };
  },
  'blocks-needed': (inputs) => ({
    blocks: answered(
      blocksNeeded({
        settings: one(inputs, 'settings'),
        stripSd: one(inputs, 'stripSd'),
        difference: one(inputs, 'difference'),
        test: 'tukey',
      }),
    ).blocks,
  }),
  'strip-sd': (inputs) => ({
    ...answered(
      stripSdOfTrials(
        many(inputs, 'meanSquares').map((meanSquareError, index) => ({
          meanSquareError,
          errorDegreesOfFreedom: many(inputs, 'degreesOfFreedom')[index] as number,
        })),
      ),
    ),
  }),
  'split-planter': (inputs) => {
    const laid = splitPlanterLayout({
      settings: ['A', 'B'],
      passes: one(inputs, 'passes'),
      seed: one(inputs, 'seed'),
    });
    return {
      passesLeft: laid.passes.filter((pass) => pass.strips[0]?.setting === 'A').length,
      smallestP: laid.smallestAttainableP,
    };
  },
  'changing-hours': (inputs) => ({
    ...changingHours((inputs.settings as string).split(' '), one(inputs, 'minutesPerChange')),
  }),
};

describe('comparisonEntries', () => {
  it.each(comparisonEntries.map((entry) => [entry.id, entry] as const))(
    'figures the example of %s again',
    (id, { workedExample }) => {
      const figured = again[id]?.(workedExample.inputs) ?? {};
      for (const [name, expected] of Object.entries(workedExample.expected)) {
        expect(Math.abs((figured[name] ?? Number.NaN) - expected), name).toBeLessThanOrEqual(
          workedExample.tolerance,
        );
      }
    },
  );

  it('fills every field, and uses an id once, also beside the other comparisons', () => {
    const ids = [...comparisonEntries, ...inferenceRegister].map((entry) => entry.id);
    for (const { id } of comparisonEntries)
      expect(ids.filter((each) => each === id).length, id).toBeGreaterThan(0);
    expect(new Set(comparisonEntries.map((entry) => entry.id)).size).toBe(comparisonEntries.length);
    for (const { id, version, name, sentence, equation, source, domain, limits } of comparisonEntries) {
      for (const text of [id, version, name, sentence, equation, source, domain, limits])
        expect(text).not.toBe('');
    }
  });
});
