import { queryOptions } from '@tanstack/react-query';
import { apiPaths } from '@/lib/paths/paths';
import { comparisonSchema } from '@/lib/schemas/comparison';
import { getJson } from '../request';

/** Counts come in while somebody looks: the comparison is asked for again this often, and whenever the window is come back to. */
const refetchMilliseconds = 30_000;

/** The comparison of a planting's trial; the page fills the same key on the server. */
export function comparisonQuery(org: string, planting: string) {
  return queryOptions({
    queryKey: ['comparison', org, planting],
    queryFn: async ({ signal }) => comparisonSchema.parse(await getJson(apiPaths.comparison(org, planting), signal)),
    refetchInterval: refetchMilliseconds,
    refetchOnWindowFocus: true,
  });
}
