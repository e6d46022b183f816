import { operationRoute } from '@/lib/server/http/operation-route';
import { decisionsOperations } from '@/lib/server/services/decisions/operations';

export const POST = operationRoute(decisionsOperations);
