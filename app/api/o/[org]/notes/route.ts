import { operationRoute } from '@/lib/server/http/operation-route';
import { notesOperations } from '@/lib/server/services/notes/operations';

export const POST = operationRoute(notesOperations);
