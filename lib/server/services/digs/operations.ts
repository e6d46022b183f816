import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordDig } from './record-dig';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const digsOperations: readonly OperationHandler[] = [recordDig];
