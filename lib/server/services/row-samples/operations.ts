import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { addRowSamples } from './add-row-samples';
import { changeRowSample } from './change-row-sample';
import { removeRowSample } from './remove-row-sample';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const rowSamplesOperations: readonly OperationHandler[] = [addRowSamples, changeRowSample, removeRowSample];
