import { operationRoute } from '@/lib/server/http/operation-route';
import { depthReadingsOperations } from '@/lib/server/services/depth-readings/operations';

export const POST = operationRoute(depthReadingsOperations);
