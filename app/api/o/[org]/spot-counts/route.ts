import { operationRoute } from '@/lib/server/http/operation-route';
import { spotCountsOperations } from '@/lib/server/services/spot-counts/operations';

export const POST = operationRoute(spotCountsOperations);
