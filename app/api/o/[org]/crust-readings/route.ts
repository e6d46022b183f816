import { operationRoute } from '@/lib/server/http/operation-route';
import { crustReadingsOperations } from '@/lib/server/services/crust-readings/operations';

export const POST = operationRoute(crustReadingsOperations);
