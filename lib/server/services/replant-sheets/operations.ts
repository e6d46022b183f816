import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { saveReplantSheet } from './save-replant-sheet';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const replantSheetsOperations: readonly OperationHandler[] = [saveReplantSheet];
