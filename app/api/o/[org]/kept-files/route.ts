import { handlerAmong, keptFileRoute } from '@/lib/server/http/operation-route';
import { allOperations } from '@/lib/server/operations/all-operations';

export const POST = keptFileRoute(handlerAmong(allOperations));
