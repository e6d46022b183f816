import type { RowSample } from '@/lib/agronomy/row-sample';
import type { RowScores } from '@/lib/agronomy/row-scores';
import type { TypicalRow } from '@/lib/schemas/comparison';
import type { CoreSamples } from '../scores/core-samples';
import { drawnPlants } from '../scores/drawn-plants';

type Candidate = { sample: RowSample; plantsPerAcre: number; spreadDays: number | null };

/**
 * The row sample that is drawn for a setting: among those with a tape sheet, the one whose stand and spread lie nearest to
 * their medians, each distance taken in parts of the median so that plants and days weigh alike (own choice, said beside it).
 */
export function typicalRow(
  core: CoreSamples,
  samples: readonly RowSample[],
  scores: ReadonlyMap<string, RowScores>,
): TypicalRow | null {
  const candidates = samples.flatMap((sample): Candidate[] => {
    const figures = scores.get(sample.rowSampleId)?.figures;
    if (!sample.tape || figures?.plantsPerAcre.kind !== 'value') return [];
    const spreadDays = figures.spreadDays.kind === 'value' ? figures.spreadDays.value.days : null;
    return [{ sample, plantsPerAcre: figures.plantsPerAcre.value.plantsPerAcre, spreadDays }];
  });
  const timed = candidates.filter((candidate) => candidate.spreadDays !== null);
  // A row without a spread cannot be held against the median spread while others have one.
  const eligible = timed.length > 0 ? timed : candidates;
  const stand = median(eligible.map((candidate) => candidate.plantsPerAcre));
  const spread = median(timed.map((candidate) => candidate.spreadDays ?? 0));
  const distance = (candidate: Candidate) =>
    apart(candidate.plantsPerAcre, stand) + (candidate.spreadDays === null ? 0 : apart(candidate.spreadDays, spread));
  const chosen = [...eligible].sort((a, b) => distance(a) - distance(b))[0];
  const row = core.rowSamples.find((each) => each.id === chosen?.sample.rowSampleId);
  const strip = core.strips.find((each) => each.id === row?.stripId);
  if (!chosen || !row || !strip) return null;
  return {
    rowSampleId: row.id,
    label: row.label,
    stripNumber: strip.number,
    lengthInches: chosen.sample.lengthInches,
    startEnd: row.startEnd,
    farEnd: row.farEnd,
    plants: drawnPlants(chosen.sample),
    spreadDays: chosen.spreadDays,
    plantsPerAcre: chosen.plantsPerAcre,
    chosenAmong: eligible.length,
    chosenBy: timed.length > 0 ? 'stand-and-spread' : 'stand',
  };
}

function median(numbers: readonly number[]): number {
  const sorted = [...numbers].sort((a, b) => a - b);
  const middle = sorted.length / 2;
  const [left, right] = [sorted[Math.ceil(middle) - 1], sorted[Math.floor(middle)]];
  return left === undefined || right === undefined ? 0 : (left + right) / 2;
}

function apart(figure: number, from: number): number {
  return from === 0 ? Math.abs(figure) : Math.abs(figure - from) / from;
}
