import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordNote } from './record-note';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const notesOperations: readonly OperationHandler[] = [recordNote];
