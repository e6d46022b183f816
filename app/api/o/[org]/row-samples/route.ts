import { operationRoute } from '@/lib/server/http/operation-route';
import { rowSamplesOperations } from '@/lib/server/services/row-samples/operations';

export const POST = operationRoute(rowSamplesOperations);
