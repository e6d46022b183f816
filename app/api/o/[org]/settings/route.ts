import { operationRoute } from '@/lib/server/http/operation-route';
import { settingsOperations } from '@/lib/server/services/settings/operations';

export const POST = operationRoute(settingsOperations);
