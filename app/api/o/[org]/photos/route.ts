import { operationRoute } from '@/lib/server/http/operation-route';
import { photosOperations } from '@/lib/server/services/photos/operations';

export const POST = operationRoute(photosOperations);
