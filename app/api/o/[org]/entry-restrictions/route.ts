import { operationRoute } from '@/lib/server/http/operation-route';
import { entryRestrictionsOperations } from '@/lib/server/services/entry-restrictions/operations';

export const POST = operationRoute(entryRestrictionsOperations);
