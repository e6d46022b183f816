import { operationRoute } from '@/lib/server/http/operation-route';
import { residueReadingsOperations } from '@/lib/server/services/residue-readings/operations';

export const POST = operationRoute(residueReadingsOperations);
