import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { layOutTrial } from './lay-out-trial';
import { lockTrial } from './lock-trial';
import { recordAsPlanted } from './record-as-planted';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const trialsOperations: readonly OperationHandler[] = [layOutTrial, lockTrial, recordAsPlanted];
