import { operationRoute } from '@/lib/server/http/operation-route';
import { conditionsOperations } from '@/lib/server/services/conditions/operations';

export const POST = operationRoute(conditionsOperations);
