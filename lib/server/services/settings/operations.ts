import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { addSetting } from './add-setting';
import { changeSetting } from './change-setting';
import { removeSetting } from './remove-setting';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const settingsOperations: readonly OperationHandler[] = [addSetting, changeSetting, removeSetting];
