import { queryOptions } from '@tanstack/react-query';
import { apiPaths } from '@/lib/paths/paths';
import { scoresSchema } from '@/lib/schemas/scores';
import { getJson } from '../request';

/** Counts come in while somebody looks: figures are asked for again this often, and whenever the window is come back to. */
const refetchMilliseconds = 30_000;

/** The scores of a planting; the page fills the same key on the server. */
export function scoresQuery(org: string, planting: string) {
  return queryOptions({
    queryKey: ['scores', org, planting],
    queryFn: async ({ signal }) => scoresSchema.parse(await getJson(apiPaths.scores(org, planting), signal)),
    refetchInterval: refetchMilliseconds,
    refetchOnWindowFocus: true,
  });
}
