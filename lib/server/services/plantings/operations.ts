import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { addPlanting } from './add-planting';
import { changePlanting } from './change-planting';
import { removePlanting } from './remove-planting';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const plantingsOperations: readonly OperationHandler[] = [addPlanting, changePlanting, removePlanting];
