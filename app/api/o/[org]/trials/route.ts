import { operationRoute } from '@/lib/server/http/operation-route';
import { trialsOperations } from '@/lib/server/services/trials/operations';

export const POST = operationRoute(trialsOperations);
