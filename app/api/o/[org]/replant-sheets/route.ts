import { operationRoute } from '@/lib/server/http/operation-route';
import { replantSheetsOperations } from '@/lib/server/services/replant-sheets/operations';

export const POST = operationRoute(replantSheetsOperations);
