import { operationRoute } from '@/lib/server/http/operation-route';
import { markerTalliesOperations } from '@/lib/server/services/marker-tallies/operations';

export const POST = operationRoute(markerTalliesOperations);
