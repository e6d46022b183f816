import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordCondition } from './record-condition';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const conditionsOperations: readonly OperationHandler[] = [recordCondition];
