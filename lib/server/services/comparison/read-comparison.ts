import 'server-only';
import { comparisonFinding, type HeadlineComparison } from '@/lib/agronomy/comparison-finding';
import { randomisationTest } from '@/lib/agronomy/inference/randomisation-test';
import { mapOutcome, type Outcome } from '@/lib/agronomy/outcome';
import { comparedFigures, comparisonSchema, type Comparison } from '@/lib/schemas/comparison';
import type { ReadContext } from '../../operations/context';
import { readCoreSamples } from '../scores/core-samples';
import { plantingFacts } from '../scores/planting-facts';
import { soundSamples } from '../scores/sound-samples';
import { compareFigure, type ComparedFigureResult, type ComparisonPlan } from './compare-figure';
import { comparedSettings } from './compared-settings';
import { comparedStrips } from './compared-strips';
import { comparisonNotes } from './comparison-notes';

/**
 * How the settings of a planting's trial compare: the main figure as it was planned, with what it supports saying, and every
 * other figure beside it without a claim.
 */
export async function readComparison(context: ReadContext, { planting }: { planting: string }): Promise<Comparison> {
  const core = await readCoreSamples(context, planting);
  const { trial } = core;
  if (!trial) return { kind: 'no-trial', planting: plantingFacts(core) };
  const sound = soundSamples(core.samples);
  const strips = comparedStrips(core, sound.samples);
  const plan = { mainFigure: trial.mainFigure, rule: trial.comparisonRule, referenceSettingId: trial.referenceSettingId };
  const results = comparedFigures.map((figure) => compareFigure(strips, figure, plan));
  const main = results.find((result) => result.wire.figure === trial.mainFigure) as ComparedFigureResult;
  const notes = comparisonNotes(core, sound, strips, main.figures.length);
  const dealt = new Set(
    core.strips.filter((strip) => !notes.blocksNotAsDealt.includes(strip.blockNumber)).map((strip) => strip.blockId),
  );
  // What leaves is what the schema names: a field added to the core later does not slip out with it.
  return comparisonSchema.parse({
    kind: 'trial',
    planting: plantingFacts(core),
    trial: {
      trialId: trial.id,
      mainFigure: trial.mainFigure,
      rule: trial.comparisonRule,
      referenceSettingId: trial.referenceSettingId,
      blocks: new Set(core.strips.map((strip) => strip.blockId)).size,
      isLocked: trial.lockedAt !== null,
      lockedAt: trial.lockedAt,
    },
    settings: comparedSettings(core, sound, strips),
    figures: results.map((result) => result.wire),
    finding: comparisonFinding(headlineComparison(main, plan), trial.mainFigure, trial.referenceSettingId),
    // The chance that laid the strips vouches only for blocks that were run as it dealt them.
    randomization: randomisationTest(
      main.figures.filter((strip) => dealt.has(strip.block)),
      trial.randomSeed,
    ),
    notes,
  } satisfies Comparison);
}

function headlineComparison(main: ComparedFigureResult, { rule }: ComparisonPlan): Outcome<HeadlineComparison> {
  return mapOutcome(main.analysis, (analysis) => ({
    rule,
    pairs: main.pairs.map(({ first, second, difference, lower, upper, toldApart }) => ({
      first,
      second,
      difference,
      lower,
      upper,
      toldApart,
    })),
    blocks: analysis.blocks,
    errorDegreesOfFreedom: analysis.errorDegreesOfFreedom,
    leftOut: analysis.leftOut.map(({ setting }) => setting),
  }));
}
