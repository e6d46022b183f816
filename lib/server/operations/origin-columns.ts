import type { WriteContext } from './context';

/** The bookkeeping columns of a new row: the tenant, where it came from, which operation made it, and who sent that. */
export function originColumns({ actor, operation, originKind }: WriteContext, importId: string | null = null) {
  return {
    organisationId: actor.organisationId,
    originKind: importId ? ('import' as const) : originKind,
    importId,
    operationId: operation.operationId,
    createdBy: actor.personId,
  };
}
