import { operationRoute } from '@/lib/server/http/operation-route';
import { tapeSheetsOperations } from '@/lib/server/services/tape-sheets/operations';

export const POST = operationRoute(tapeSheetsOperations);
