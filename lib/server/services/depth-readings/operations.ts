import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordDepth } from './record-depth';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const depthReadingsOperations: readonly OperationHandler[] = [recordDepth];
