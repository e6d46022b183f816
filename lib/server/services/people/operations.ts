import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const peopleOperations: readonly OperationHandler[] = [];
