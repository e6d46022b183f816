import { operationRoute } from '@/lib/server/http/operation-route';
import { peopleOperations } from '@/lib/server/services/people/operations';

export const POST = operationRoute(peopleOperations);
