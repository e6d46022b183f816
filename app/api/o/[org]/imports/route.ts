import { operationRoute } from '@/lib/server/http/operation-route';
import { importsOperations } from '@/lib/server/services/imports/operations';

export const POST = operationRoute(importsOperations);
