import { queryOptions } from '@tanstack/react-query';
import { apiPaths } from '@/lib/paths/paths';
import { replantSchema } from '@/lib/schemas/replant';
import { getJson } from '../request';

/**
 * Keep or replant of a planting or of one zone; the page fills the same key on the server. It is asked for again after a
 * write and when the window is come back to, and not by the clock: nobody's numbers move while they read them.
 */
export function replantQuery(org: string, planting: string, zone: string | null) {
  const path = apiPaths.replant(org, planting);
  return queryOptions({
    queryKey: ['replant', org, planting, zone],
    queryFn: async ({ signal }) =>
      replantSchema.parse(await getJson(zone === null ? path : `${path}?zone=${zone}`, signal)),
    refetchOnWindowFocus: true,
  });
}
