import { z } from 'zod';
import { scoreLevels } from '@/lib/schemas/scores';
import { readRoute } from '@/lib/server/http/organisation-route';
import { readScores } from '@/lib/server/services/scores/read-scores';

export const GET = readRoute({
  action: 'scores.read',
  ids: z.object({ planting: z.uuid() }),
  query: z.object({ level: z.enum(scoreLevels).default('planting') }),
  service: readScores,
});
