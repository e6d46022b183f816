import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordException } from './record-exception';
import { recordRestriction } from './record-restriction';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const entryRestrictionsOperations: readonly OperationHandler[] = [recordRestriction, recordException];
