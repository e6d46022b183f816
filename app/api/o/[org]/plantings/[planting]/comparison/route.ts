import { z } from 'zod';
import { readRoute } from '@/lib/server/http/organisation-route';
import { readComparison } from '@/lib/server/services/comparison/read-comparison';

export const GET = readRoute({
  action: 'comparison.read',
  ids: z.object({ planting: z.uuid() }),
  query: z.object({}),
  service: readComparison,
});
