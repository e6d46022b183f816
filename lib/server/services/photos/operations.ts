import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordPhoto } from './record-photo';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const photosOperations: readonly OperationHandler[] = [recordPhoto];
