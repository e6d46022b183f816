import { randomStream, type RandomStream } from '@/lib/agronomy/random';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { normalDraw } from './normal-draw';
import { emergencePattern } from './simulate-emergence';
import { simulateRow, type SimulatedSeed } from './simulate-row';
import { lossRunSeedsMean, placeSdDays, rowCoverSd, trialPlan, trialTruth, type SettingKey } from './trial-truth';

export type SimulatedRow = { seeds: SimulatedSeed[]; coverMarks: number };

/** A strip with what is true of it: its setting's half-up day moved by its block and by itself. */
export type SimulatedStrip = { blockNumber: number; setting: SettingKey; trueHalfUpDays: number; rows: SimulatedRow[] };

/**
 * The trial as it truly came up, strip by strip: for each block the four settings in the order of the truth, whatever the
 * order in the field. The same seed gives the same plants on every machine.
 */
export function simulateTrial(seed: number): SimulatedStrip[] {
  const stream = randomStream(seed);
  return Array.from({ length: trialPlan.blocks }, (_, index) => {
    const blockDays = normalDraw(stream, { mean: 0, sd: placeSdDays.block });
    return trialTruth.map((truth): SimulatedStrip => {
      const shiftDays = blockDays + normalDraw(stream, { mean: 0, sd: placeSdDays.strip });
      const rows = Array.from({ length: trialPlan.rowSamplesPerStrip }, () => simulateStripRow(truth, shiftDays, stream));
      return { blockNumber: index + 1, setting: truth.key, trueHalfUpDays: truth.halfUpDays + shiftDays, rows };
    });
  }).flat();
}

function simulateStripRow(truth: (typeof trialTruth)[number], stripDays: number, stream: RandomStream): SimulatedRow {
  const { seedsPerAcre, rowSpacingInches, rowLengthInches } = trialPlan;
  const seeds = simulateRow(
    {
      lengthInches: rowLengthInches,
      theoreticalSpacingInches: theoreticalSpacingInches(seedsPerAcre, rowSpacingInches),
      emergedShare: truth.standShare,
      lossRunSeedsMean,
      pattern: emergencePattern(truth),
      shiftDays: stripDays + normalDraw(stream, { mean: 0, sd: placeSdDays.row }),
      rowSdDays: placeSdDays.row,
    },
    stream,
  );
  const coverShare = Math.min(0.98, Math.max(0.02, normalDraw(stream, { mean: truth.inRowCoverShare, sd: rowCoverSd })));
  const coverMarks = Array.from({ length: trialPlan.coverMarks }, () => stream.nextUnit() < coverShare).filter(Boolean).length;
  return { seeds, coverMarks };
}
