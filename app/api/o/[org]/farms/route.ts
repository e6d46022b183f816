import { operationRoute } from '@/lib/server/http/operation-route';
import { farmsOperations } from '@/lib/server/services/farms/operations';

export const POST = operationRoute(farmsOperations);
