import { z } from 'zod';
import { readRoute } from '@/lib/server/http/organisation-route';
import { readRoundDay } from '@/lib/server/services/round-day/read-round-day';

export const GET = readRoute({ action: 'observations.read', ids: z.object({}), query: z.object({}), service: readRoundDay });
