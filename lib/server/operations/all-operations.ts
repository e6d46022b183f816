import 'server-only';
import { conditionsOperations } from '../services/conditions/operations';
import { countsOperations } from '../services/counts/operations';
import { crustReadingsOperations } from '../services/crust-readings/operations';
import { decisionsOperations } from '../services/decisions/operations';
import { depthReadingsOperations } from '../services/depth-readings/operations';
import { digsOperations } from '../services/digs/operations';
import { entryRestrictionsOperations } from '../services/entry-restrictions/operations';
import { farmsOperations } from '../services/farms/operations';
import { fieldTransectsOperations } from '../services/field-transects/operations';
import { fieldsOperations } from '../services/fields/operations';
import { importsOperations } from '../services/imports/operations';
import { markerTalliesOperations } from '../services/marker-tallies/operations';
import { notesOperations } from '../services/notes/operations';
import { photosOperations } from '../services/photos/operations';
import { peopleOperations } from '../services/people/operations';
import { plantingsOperations } from '../services/plantings/operations';
import { replantSheetsOperations } from '../services/replant-sheets/operations';
import { residueReadingsOperations } from '../services/residue-readings/operations';
import { rowSamplesOperations } from '../services/row-samples/operations';
import { settingsOperations } from '../services/settings/operations';
import { spotCountsOperations } from '../services/spot-counts/operations';
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
  ...depthReadingsOperations,
  ...digsOperations,
  ...crustReadingsOperations,
  ...fieldTransectsOperations,
  ...conditionsOperations,
  ...notesOperations,
  ...markerTalliesOperations,
  ...entryRestrictionsOperations,
  ...spotCountsOperations,
  ...photosOperations,
  ...withdrawalsOperations,
  ...importsOperations,
  ...replantSheetsOperations,
  ...decisionsOperations,
];
