import type { PackedFigures, PackedRows } from '../../lib/agronomy/packed-rows';

type Fused = Omit<PackedFigures, 'known'>;

/** The same figures in one loop by hand, without a check and without a function: what the packed core is held against. */
export function fusedFigures(rows: PackedRows): Fused {
  const { placesInches, placesFrom, visitDays, plantsUp, visitsFrom, plantsHeld, areaAcres, theoreticalSpacingInches } = rows as PackedRows;
  const count = plantsHeld.length;
  const figures: Fused = {
    plantsPerAcre: new Float64Array(count), spacingInchesMean: new Float64Array(count), spacingInchesSd: new Float64Array(count), spacingCv: new Float64Array(count),
    multiplesShare: new Float64Array(count), singlesShare: new Float64Array(count), missesShare: new Float64Array(count), daysTo10: new Float64Array(count),
    daysTo50: new Float64Array(count), daysTo90: new Float64Array(count), spreadDays: new Float64Array(count),
  };
  for (let row = 0; row < count; row += 1) {
    figures.plantsPerAcre[row] = plantsHeld[row]! / areaAcres[row]!;
    const from = placesFrom[row]!;
    const to = placesFrom[row + 1]!;
    const spaces = to - from - 1;
    const mean = (placesInches[to - 1]! - placesInches[from]!) / spaces;
    const multipleBelow = (0.5 + 5e-10) * theoreticalSpacingInches[row]!;
    const singleBelow = (1.5 + 5e-10) * theoreticalSpacingInches[row]!;
    let squares = 0;
    let multiples = 0;
    let singles = 0;
    let before = placesInches[from]!;
    for (let index = from + 1; index < to; index += 1) {
      const place = placesInches[index]!;
      const spacing = place - before;
      squares += (spacing - mean) * (spacing - mean);
      if (spacing < multipleBelow) multiples += 1;
      else if (spacing < singleBelow) singles += 1;
      before = place;
    }
    const sd = Math.sqrt(squares / (spaces - 1));
    figures.spacingInchesMean[row] = mean;
    figures.spacingInchesSd[row] = sd;
    figures.spacingCv[row] = sd / mean;
    figures.multiplesShare[row] = multiples / spaces;
    figures.singlesShare[row] = singles / spaces;
    figures.missesShare[row] = (spaces - multiples - singles) / spaces;
    const first = visitsFrom[row]!;
    const last = visitsFrom[row + 1]! - 1;
    const emerged = plantsUp[last]!;
    const tolerance = 1e-9 * Math.max(1, emerged);
    let visit = first;
    let ten = 0;
    for (let share = 0; share < 3; share += 1) {
      const target = (share === 0 ? 0.1 : share === 1 ? 0.5 : 0.9) * emerged;
      while (visit < last && plantsUp[visit]! < target - tolerance) visit += 1;
      const up = plantsUp[visit]!;
      let day = visitDays[visit]!;
      if (visit > first && Math.abs(up - target) > tolerance) {
        const upBefore = plantsUp[visit - 1]!;
        const dayBefore = visitDays[visit - 1]!;
        day = dayBefore + ((target - upBefore) / (up - upBefore)) * (day - dayBefore);
      }
      if (share === 0) figures.daysTo10[row] = ten = day;
      else if (share === 1) figures.daysTo50[row] = day;
      else {
        figures.daysTo90[row] = day;
        figures.spreadDays[row] = day - ten;
      }
    }
  }
  return figures;
}
