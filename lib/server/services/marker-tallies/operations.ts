import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { recordMarkers } from './record-markers';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const markerTalliesOperations: readonly OperationHandler[] = [recordMarkers];
