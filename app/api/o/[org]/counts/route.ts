import { operationRoute } from '@/lib/server/http/operation-route';
import { countsOperations } from '@/lib/server/services/counts/operations';

export const POST = operationRoute(countsOperations);
