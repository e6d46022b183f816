import type { PackedRows } from '../../lib/agronomy/packed-rows';
import { packRows, type RowToPack } from '../../lib/agronomy/pack-rows';
import { randomStream } from '../../lib/agronomy/random';

export type SimulatedRows = { packed: PackedRows; records: RowToPack[] };

/** The same invented row samples twice: packed in typed arrays, and as one object each. */
export function simulatedRows({ rows, plants, visits, seed }: { rows: number; plants: number; visits: number; seed: number }): SimulatedRows {
  const stream = randomStream(seed);
  const areaAcres = (209.088 * 30) / 6_272_640;
  const theoreticalSpacingInches = 6_272_640 / (30 * 34_000);
  const records = Array.from({ length: rows }, (): RowToPack => {
    let place = 0;
    let up = 0;
    return {
      placesInches: Array.from({ length: plants }, () => (place += Math.round((2 + stream.nextUnit() * 9) * 2) / 2)),
      visits: Array.from({ length: visits }, (_, visit) => {
        up = visit === visits - 1 ? plants : Math.min(plants, up + (visit > 0 ? stream.nextBelow(8) : 0));
        return { days: 8 + visit, plantsUp: up };
      }),
      plantsHeld: plants,
      areaAcres,
      theoreticalSpacingInches,
    };
  });
  return { packed: packRows(records), records };
}
