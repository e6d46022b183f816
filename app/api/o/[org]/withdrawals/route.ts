import { operationRoute } from '@/lib/server/http/operation-route';
import { withdrawalsOperations } from '@/lib/server/services/withdrawals/operations';

export const POST = operationRoute(withdrawalsOperations);
