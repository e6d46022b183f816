import { personReadRoute } from '@/lib/server/http/person-route';
import { readRoundPerson } from '@/lib/server/services/round-day/read-round-person';

export const GET = personReadRoute(readRoundPerson);
