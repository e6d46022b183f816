import { SAME_NUMBER } from './constants';
import { ImpossibleInput, insufficient, value, type Outcome } from './outcome';
import { requiredCount } from './required-count';
import { requiredNumber } from './required-number';
import { wilsonInterval, type ShareInterval } from './share-of-seed';

/** What a dig at a missing place found, in the words of the key of the Methods page. */
export const digFindings = [
  'no-seed',
  'seed-firm',
  'seed-swollen',
  'seed-rotten',
  'leafed-below-ground',
  'eaten',
  'burned-by-fertilizer',
  'residue-in-furrow',
  'other',
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
  /** Shares of the digs, not of all that is missing. */
  dug: Partial<Record<DigFinding, SeedShare>>;
  digs: number;
  /** Missing and not dug. It has no interval: how many are dug is somebody's choice and no chance. */
  notAccountedFor: { seeds: number; share: number };
  /** Plants and digs above the planned number: the planter dropped more than its rate. 0 where there are none. */
  beyondPlanned: number;
};

/**
 * Where did the seeds of a row sample, a strip or a setting go?
 *
 * Takes row samples with the seeds their rate puts into them (above 0), plants by class (whole, 0 or more) and what was
 * found at each dug place. Returns shares of the planned seeds with 95 % intervals, shares of the digs by what was found,
 * what nobody can account for, and how many seeds there were beyond the planned ones. Insufficient without a row; an
 * interval also where there are more than planned. Throws ImpossibleInput for negative or broken numbers of plants, seeds
 * not above 0 and a finding that is not in the key.
 * Method: planned seeds less plants, doubles apart, are missing; Wilson intervals (1927). The planned number is the rate
 * times the length: it evens out over row samples, and more found than planned is shown and not refused or cut off.
 * What it does not tell: *no seed* is a seed not dropped or one that birds or rodents took; a key suggests, it does not
 * decide. Digs speak for themselves and are not spread over places that nobody dug. Neighbors share crust, depth and
 * residue: the intervals are of the counting alone.
 * Example: 34 seeds, 29 on time, 2 late, 1 double, digs at 2 of 3 places finding no seed and a rotten one: 85 % on time,
 * 6 % late, 9 % missing; of 2 digs one without a seed, one rotten; 1 seed, 3 %, not accounted for.
 */
export function seedAccount(rows: readonly AccountedRow[]): Outcome<SeedAccount> {
  if (rows.length === 0) return insufficient('no-tape-sheets', '1 row sample with a tape sheet', 'none');
  const plantsOf = (key: 'onTime' | 'late' | 'dayNotSeen' | 'doubles') =>
    rows.reduce((sum, row) => sum + requiredCount(row[key], key, { atLeast: 0 }), 0);
  const planned = rows.reduce((sum, row) => sum + requiredNumber(row.seeds, 'seeds', { above: 0 }), 0);
  const plants = { onTime: plantsOf('onTime'), late: plantsOf('late'), dayNotSeen: plantsOf('dayNotSeen') };
  const standing = plants.onTime + plants.late + plants.dayNotSeen;
  const digs = rows.flatMap((row) => row.digs);
  const left = planned - standing;
  const notAccounted = Math.max(0, left - digs.length);
  return value({
    seedsPlanned: planned,
    onTime: shareOf(plants.onTime, planned),
    late: shareOf(plants.late, planned),
    dayNotSeen: shareOf(plants.dayNotSeen, planned),
    missing: missingOf(left, planned, standing),
    doubles: plantsOf('doubles'),
    dug: findingsOf(digs),
    digs: digs.length,
    notAccountedFor: { seeds: notAccounted, share: notAccounted / planned },
    beyondPlanned: digs.length - left > SAME_NUMBER ? digs.length - left : 0,
  });
}

function shareOf(seeds: number, all: number): SeedShare {
  return { seeds, share: seeds / all, interval: wilsonInterval(seeds, all) };
}

function missingOf(left: number, planned: number, standing: number): SeedShare {
  if (left >= -SAME_NUMBER) return shareOf(Math.max(0, left), planned);
  // None missing is then no finding about seeds, so the interval of no plants of so many seeds would claim too much.
  return { seeds: 0, share: 0, interval: wilsonInterval(standing, planned) };
}

function findingsOf(digs: readonly DigFinding[]): SeedAccount['dug'] {
  if (digs.some((each) => !digFindings.includes(each))) {
    throw new ImpossibleInput('What a dig found is not in the key.', 'digs');
  }
  const dug: SeedAccount['dug'] = {};
  for (const finding of digFindings) {
    const found = digs.filter((each) => each === finding).length;
    if (found > 0) dug[finding] = shareOf(found, digs.length);
  }
  return dug;
}
