import { startTexts } from '@/lib/texts/start-texts';
import type { Role } from '@/lib/schemas/vocabulary';

export type StartPlanting = {
  thisSeason: boolean;
  summedUp: boolean;
  decided: { choice: 'keep' | 'replant'; at: string } | null;
  rows: readonly unknown[];
};

/** What a person has to know first when they come in, as one line. */
export function startHeadline(role: Role, plantings: readonly StartPlanting[]): string {
  const season = plantings.filter((each) => each.thisSeason);
  if (role === 'scout') {
    const rows = season.reduce((sum, each) => sum + each.rows.length, 0);
    return rows === 0 ? startTexts.nothingToCount : startTexts.rowsToCount(String(rows));
  }
  const waiting = season.filter(awaitsDecision).length;
  if (waiting > 0) return startTexts.waiting(String(waiting));
  return role === 'grower' ? startTexts.growerNone : startTexts.counting(String(season.length));
}

/** A sum was put together and nobody has signed yet. */
export const awaitsDecision = (planting: StartPlanting) => planting.summedUp && planting.decided === null;
