import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { withdrawObservation } from './withdraw-observation';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const withdrawalsOperations: readonly OperationHandler[] = [withdrawObservation];
