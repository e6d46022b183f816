import { operationRoute } from '@/lib/server/http/operation-route';
import { plantingsOperations } from '@/lib/server/services/plantings/operations';

export const POST = operationRoute(plantingsOperations);
