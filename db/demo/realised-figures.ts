import type { SimulatedStrip } from './simulate-trial';
import { trialPlan, type SettingKey } from './trial-truth';

export type RealisedFigures = { halfUpDays: number; spreadDays: number; standShare: number; lateShare: number; inRowCoverShare: number };

const squareInchesPerAcre = 6_272_640;

/**
 * What chance made of a setting's truth in this one trial, read off every plant's own moment and not off visits: half-up day
 * and spread as means of its strips, the shares over all its plants, seeds and marks. None of the product's own figures are
 * used, so that they can be held against these.
 */
export function realisedFigures(strips: readonly SimulatedStrip[], setting: SettingKey): RealisedFigures {
  const own = strips.filter((strip) => strip.setting === setting);
  const rows = own.flatMap((strip) => strip.rows);
  const plants = rows.flatMap((row) => row.seeds.filter((seed) => seed.emergedDays !== null));
  const days = own.map(emergedDays);
  const { seedsPerAcre, rowSpacingInches, rowLengthInches, coverMarks } = trialPlan;
  const seedsMeant = (seedsPerAcre * rows.length * rowLengthInches * rowSpacingInches) / squareInchesPerAcre;
  return {
    halfUpDays: mean(days.map((each) => quantile(each, 0.5))),
    spreadDays: mean(days.map((each) => quantile(each, 0.9) - quantile(each, 0.1))),
    standShare: plants.length / seedsMeant,
    lateShare: plants.filter((plant) => plant.isLate).length / plants.length,
    inRowCoverShare: mean(rows.map((row) => row.coverMarks / coverMarks)),
  };
}

/** From 10 to 90 % of one strip's plants, in days. */
export function realisedSpreadDays(strip: SimulatedStrip): number {
  const days = emergedDays(strip);
  return quantile(days, 0.9) - quantile(days, 0.1);
}

function emergedDays(strip: SimulatedStrip): number[] {
  return strip.rows
    .flatMap((row) => row.seeds.flatMap((seed) => (seed.emergedDays === null ? [] : [seed.emergedDays])))
    .sort((a, b) => a - b);
}

/** Straight between the sorted values, the first being the quantile of 0 and the last that of 1. */
function quantile(sorted: readonly number[], share: number): number {
  const place = (sorted.length - 1) * share;
  const below = Math.floor(place);
  const low = sorted[below] ?? NaN;
  return low + (place - below) * ((sorted[below + 1] ?? low) - low);
}

const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
