import { queryOptions } from '@tanstack/react-query';
import { apiPaths } from '@/lib/paths/paths';
import { scoresSchema, type ScoreLevel } from '@/lib/schemas/scores';
import { getJson } from '../request';

/** Counts come in while somebody looks: figures are asked for again this often, and whenever the window is come back to. */
const refetchMilliseconds = 30_000;

/** The scores of a planting at one level; the page fills the same key on the server. */
export function scoresQuery(org: string, planting: string, level: ScoreLevel) {
  return queryOptions({
    queryKey: ['scores', org, planting, level],
    queryFn: async ({ signal }) => scoresSchema.parse(await getJson(`${apiPaths.scores(org, planting)}?level=${level}`, signal)),
    refetchInterval: refetchMilliseconds,
    refetchOnWindowFocus: true,
  });
}
