import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { addSpotPlace } from './add-spot-place';
import { startSpotCount } from './start-spot-count';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const spotCountsOperations: readonly OperationHandler[] = [startSpotCount, addSpotPlace];
