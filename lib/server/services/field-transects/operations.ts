import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordTransect } from './record-transect';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const fieldTransectsOperations: readonly OperationHandler[] = [recordTransect];
