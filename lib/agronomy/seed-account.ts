import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';
import { wilsonInterval, type ShareInterval } from './share-of-seed';

/** What a dig at a missing place found, in the words of the key of the Methods page. */
export const digFindings = [
  'no-seed', 'seed-firm', 'seed-swollen', 'seed-rotten', 'leafed-below-ground', 'eaten', 'burned-by-fertilizer', 'residue-in-furrow', 'other',
] as const;
export type DigFinding = (typeof digFindings)[number];

/** One row sample whose tape sheet is whole. */
export type AccountedRow = {
  /** Seeds that the seeding rate puts into the length; need not be whole. */
  seeds: number;
  onTime: number;
  late: number;
  /** Plants whose day nobody saw. */
  dayNotSeen: number;
  /** Second plants of doubles: seeds that were dropped beside the planned ones. */
  doubles: number;
  /** What was found at each missing place that was dug. */
  digs: readonly DigFinding[];
};

export type SeedShare = { seeds: number; share: number; interval: Outcome<ShareInterval> };

export type SeedAccount = {
  seedsPlanned: number;
  onTime: SeedShare;
  late: SeedShare;
  dayNotSeen: SeedShare;
  /** Planned seeds without a plant, whatever became of them. */
  missing: SeedShare;
  /** Beside the planned seeds, not among them. */
  doubles: number;
  /** Of the missing places that were dug: not dropped, or dead of what. Shares of the digs, not of all that is missing. */
  dug: Partial<Record<DigFinding, SeedShare>>;
  digs: number;
  /** Missing places that nobody dug: what became of them is not known and not guessed. */
  notDug: number;
};

/**
 * Where did the seeds of a row sample, a strip or a setting go?
 *
 * Takes row samples with the seeds their rate puts into them (above 0), plants by class (whole, 0 or more) and what was
 * found at each dug place. Returns shares of the planned seeds with 95 % intervals, and shares of the digs by what was
 * found. Insufficient without a row, and where there are more plants than planned seeds even without the doubles. Throws
 * ImpossibleInput for negative numbers, and for more digs than missing places, rounded up.
 * Method: planned seeds less plants, doubles apart, are missing; Wilson intervals. *No seed* is a place not dropped; the
 * rest died. The digs speak for themselves only: they are not spread over places that nobody dug.
 * The planned number is the rate times the length, so a planter that drops more or fewer shows as missing or as doubles.
 * Seeds of one row are not independent: the intervals are of the counting alone.
 * Example: 34 seeds, 29 on time, 2 late, 1 double, digs at 2 of 3 places finding no seed and a rotten one: 85 % on time,
 * 6 % late, 9 % missing; of 2 digs one not dropped, one rotten; one place not dug.
 */
export function seedAccount(rows: readonly AccountedRow[]): Outcome<SeedAccount> {
  if (rows.length === 0) return insufficient('no-tape-sheets', '1 row sample with a tape sheet', 'none');
  const sum = (key: 'seeds' | 'onTime' | 'late' | 'dayNotSeen' | 'doubles') =>
    rows.reduce((total, row) => total + requiredNumber(row[key], key, key === 'seeds' ? { above: 0 } : { atLeast: 0 }), 0);
  const planned = sum('seeds');
  const plants = { onTime: sum('onTime'), late: sum('late'), dayNotSeen: sum('dayNotSeen') };
  const standing = plants.onTime + plants.late + plants.dayNotSeen;
  const missing = planned - standing;
  if (missing < 0) return insufficient('more-plants-than-seeds', `at most ${rounded(planned)} plants, one a seed`, `${standing} plants besides doubles`);
  const digs = rows.flatMap((row) => row.digs);
  requiredNumber(digs.length, 'digs', { atMost: Math.ceil(missing) });
  const shareOf = (seeds: number): SeedShare => ({ seeds, share: seeds / planned, interval: wilsonInterval(seeds, planned) });
  const dug: SeedAccount['dug'] = {};
  for (const finding of digFindings) {
    const found = digs.filter((each) => each === finding).length;
    if (found > 0) dug[finding] = { seeds: found, share: found / digs.length, interval: wilsonInterval(found, digs.length) };
  }
  return value({
    seedsPlanned: planned,
    onTime: shareOf(plants.onTime),
    late: shareOf(plants.late),
    dayNotSeen: shareOf(plants.dayNotSeen),
    missing: shareOf(missing),
    doubles: sum('doubles'),
    dug,
    digs: digs.length,
    notDug: Math.max(0, missing - digs.length),
  });
}

const rounded = (seeds: number) => Math.round(seeds * 10) / 10;
