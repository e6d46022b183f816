import 'server-only';
import { countsOperations } from '../services/counts/operations';
import { decisionsOperations } from '../services/decisions/operations';
import { farmsOperations } from '../services/farms/operations';
import { fieldsOperations } from '../services/fields/operations';
import { importsOperations } from '../services/imports/operations';
import { peopleOperations } from '../services/people/operations';
import { plantingsOperations } from '../services/plantings/operations';
import { replantSheetsOperations } from '../services/replant-sheets/operations';
import { residueReadingsOperations } from '../services/residue-readings/operations';
import { rowSamplesOperations } from '../services/row-samples/operations';
import { settingsOperations } from '../services/settings/operations';
import { tapeSheetsOperations } from '../services/tape-sheets/operations';
import { trialsOperations } from '../services/trials/operations';
import { withdrawalsOperations } from '../services/withdrawals/operations';
import type { OperationHandler } from './define-operation';

/** Every write there is. The batch route and the noun routes reach the same services through it. */
export const allOperations: readonly OperationHandler[] = [
  ...peopleOperations,
  ...farmsOperations,
  ...fieldsOperations,
  ...settingsOperations,
  ...plantingsOperations,
  ...trialsOperations,
  ...rowSamplesOperations,
  ...countsOperations,
  ...tapeSheetsOperations,
  ...residueReadingsOperations,
  ...withdrawalsOperations,
  ...importsOperations,
  ...replantSheetsOperations,
  ...decisionsOperations,
];
