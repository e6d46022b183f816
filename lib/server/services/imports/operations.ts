import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { takeImport } from './take-import';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const importsOperations: readonly OperationHandler[] = [takeImport];
