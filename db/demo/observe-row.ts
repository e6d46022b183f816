import type { TapeEntryKind } from '@/lib/schemas/vocabulary';
import type { SimulatedSeed } from './simulate-row';

export type CountedVisit = { day: number; marker: string; plantsUp: number };
export type ReadPlace = { typed: string; kind: TapeEntryKind; marker: string | null; leafStage: null };

/** A color a day, as a crew might take them out of its box. Twelve visits, twelve colors. */
const markerColors = ['red', 'blue', 'yellow', 'white', 'orange', 'green', 'pink', 'black', 'purple', 'brown', 'gray', 'tan'];

const doubleBelowInches = 2;
const quarters = ['', ' 1/4', ' 1/2', ' 3/4'];

/** What a scout finds in a row who comes once a day, from the first day to the last, and sets a marker of the day's color. */
export function observeCounts(seeds: readonly SimulatedSeed[], days: { first: number; last: number }): CountedVisit[] {
  return Array.from({ length: days.last - days.first + 1 }, (_, index) => {
    const day = days.first + index;
    const plantsUp = seeds.filter((seed) => seed.emergedDays !== null && seed.emergedDays <= day).length;
    return { day, marker: markerColors[index % markerColors.length] ?? '', plantsUp };
  });
}

/**
 * What the tape sheet of that row says on the last visit: every plant to a quarter of an inch with the marker that stands at
 * it, the second of a double told, a plant that is behind by sight called late, and places marked missing by eye where a
 * gap has room for them. A plant that comes up after the last visit is on no sheet.
 */
export function observeTape(
  seeds: readonly SimulatedSeed[],
  visits: readonly CountedVisit[],
  row: { lengthInches: number; theoreticalSpacingInches: number },
): ReadPlace[] {
  const lastDay = visits.at(-1)?.day ?? Infinity;
  const plants = seeds.flatMap(({ positionInches, emergedDays, isLate }) =>
    emergedDays !== null && emergedDays <= lastDay ? [{ quarterInches: Math.min(Math.round(positionInches * 4), row.lengthInches * 4), emergedDays, isLate }] : [],
  );
  return plants.flatMap((plant, index) => {
    const before = plants[index - 1]?.quarterInches;
    const isDouble = before !== undefined && plant.quarterInches - before < doubleBelowInches * 4;
    const kind: TapeEntryKind = isDouble ? 'double' : plant.isLate ? 'late' : 'plant';
    const marker = visits.find((visit) => plant.emergedDays <= visit.day)?.marker ?? null;
    const place: ReadPlace = { typed: quarterInchesTyped(plant.quarterInches), kind, marker, leafStage: null };
    return [...missingBetween(before, plant.quarterInches, row.theoreticalSpacingInches), place];
  });
}

/** By eye a gap of more than one and a half spacings lacks a plant, one of more than two and a half lacks two, and so on. */
function missingBetween(before: number | undefined, after: number, theoreticalSpacingInches: number): ReadPlace[] {
  if (before === undefined) return [];
  const lacking = Math.max(0, Math.round((after - before) / 4 / theoreticalSpacingInches) - 1);
  return Array.from({ length: lacking }, (_, index) => ({
    typed: quarterInchesTyped(Math.round(before + ((after - before) * (index + 1)) / (lacking + 1))),
    kind: 'missing',
    marker: null,
    leafStage: null,
  }));
}

function quarterInchesTyped(quarterInches: number): string {
  const whole = Math.floor(quarterInches / 4);
  return whole === 0 && quarterInches > 0 ? (quarters[quarterInches % 4] ?? '').trim() : `${whole}${quarters[quarterInches % 4]}`;
}
