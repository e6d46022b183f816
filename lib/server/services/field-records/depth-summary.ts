import type { DepthReadingRow } from '../../data/depth-reading';

const thousandthsPerUnit = 1000;

/** The depths of one reading in its own unit: mean, shallowest and deepest, and of how many plants. */
export function depthSummary({ depthsThousandths }: Pick<DepthReadingRow, 'depthsThousandths'>) {
  const depths = depthsThousandths.map((thousandths) => thousandths / thousandthsPerUnit);
  return {
    plants: depths.length,
    mean: depths.reduce((sum, depth) => sum + depth, 0) / depths.length,
    shallowest: Math.min(...depths),
    deepest: Math.max(...depths),
  };
}
