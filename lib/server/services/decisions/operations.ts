import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { signDecision } from './sign-decision';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const decisionsOperations: readonly OperationHandler[] = [signDecision];
