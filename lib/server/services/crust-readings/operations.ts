import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordCrust } from './record-crust';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const crustReadingsOperations: readonly OperationHandler[] = [recordCrust];
