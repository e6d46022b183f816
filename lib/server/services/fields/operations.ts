import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { addField } from './add-field';
import { changeField } from './change-field';
import { removeField } from './remove-field';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const fieldsOperations: readonly OperationHandler[] = [addField, changeField, removeField];
