import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { addFarm } from './add-farm';
import { changeFarm } from './change-farm';
import { removeFarm } from './remove-farm';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const farmsOperations: readonly OperationHandler[] = [addFarm, changeFarm, removeFarm];
