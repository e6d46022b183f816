import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordCount } from './record-count';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const countsOperations: readonly OperationHandler[] = [recordCount];
