import { operationRoute } from '@/lib/server/http/operation-route';
import { digsOperations } from '@/lib/server/services/digs/operations';

export const POST = operationRoute(digsOperations);
