import { operationRoute } from '@/lib/server/http/operation-route';
import { fieldTransectsOperations } from '@/lib/server/services/field-transects/operations';

export const POST = operationRoute(fieldTransectsOperations);
