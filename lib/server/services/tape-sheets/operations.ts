import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordLaidTapeSheet, recordTapeSheet } from './record-tape-sheet';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const tapeSheetsOperations: readonly OperationHandler[] = [recordTapeSheet, recordLaidTapeSheet];
