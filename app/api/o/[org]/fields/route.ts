import { operationRoute } from '@/lib/server/http/operation-route';
import { fieldsOperations } from '@/lib/server/services/fields/operations';

export const POST = operationRoute(fieldsOperations);
