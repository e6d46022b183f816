import type { CountKind } from './vocabulary';

/** As much of a count as its place among the others needs; the server and a phone hold the rest each in its own shape. */
export type Countable = { visitedOn: string; visitedAt: string | null; countedAs: CountKind; plants: number; personId: string; personName: string };

/** A visit without a time counts as noon, so that it stands between a morning's and an evening's. */
export const momentOf = (each: { visitedOn: string; visitedAt: string | null }) => `${each.visitedOn}T${each.visitedAt ?? '12:00'}`;

/** Two counts of one row are of one visit at the same day and time, and where one of two people left the time out. */
export function sameVisit(a: Countable, b: Countable): boolean {
  if (a.visitedOn !== b.visitedOn) return false;
  return momentOf(a) === momentOf(b) || (a.personId !== b.personId && (a.visitedAt === null || b.visitedAt === null));
}

/**
 * Puts the standing counts of one row sample in the order of their visits, sums up "new since" into "so far", and sets a
 * second count of the same visit beside the first. Counts come in as recorded, earliest first.
 */
export function resolveCounts<Row extends Countable>(rows: readonly Row[]): (Row & { plantsUp: number; used: boolean; alsoCountedBy: string | null })[] {
  const paired = besideTheFirst(rows).sort((a, b) => (a.moment < b.moment ? -1 : a.moment > b.moment ? 1 : Number(b.used) - Number(a.used)));
  let before = 0;
  let standing = 0;
  let moment = '';
  return paired.map((each) => {
    if (each.moment !== moment) before = standing;
    moment = each.moment;
    const plantsUp = each.row.countedAs === 'new' ? before + each.row.plants : each.row.plants;
    if (each.used) standing = plantsUp;
    return { ...each.row, plantsUp, used: each.used, alsoCountedBy: each.alsoCountedBy };
  });
}

type Paired<Row> = { row: Row; moment: string; used: boolean; alsoCountedBy: string | null };

/** A second count of a visit takes the first one's moment, so that both add to what stood before that visit. */
function besideTheFirst<Row extends Countable>(asRecorded: readonly Row[]): Paired<Row>[] {
  const paired: Paired<Row>[] = [];
  for (const row of asRecorded) {
    const first = paired.find((other) => other.used && sameVisit(other.row, row));
    if (first) first.alsoCountedBy ??= row.personName;
    paired.push({ row, moment: momentOf(first?.row ?? row), used: !first, alsoCountedBy: first?.row.personName ?? null });
  }
  return paired;
}
