import { z } from 'zod';
import { readRoute } from '@/lib/server/http/organisation-route';
import { readReplant } from '@/lib/server/services/replant/read-replant';

/** Keep or replant for a planting, or for the zone named in the query; for those who decide and those who advise them. */
export const GET = readRoute({
  action: 'replant.read',
  ids: z.object({ planting: z.uuid() }),
  query: z.object({ zone: z.uuid('Give the zone by its id.').optional() }),
  service: readReplant,
});
