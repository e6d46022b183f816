import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordResidue } from './record-residue';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const residueReadingsOperations: readonly OperationHandler[] = [recordResidue];
