import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { takeImportSchema, type TakeImportInput } from '@/lib/schemas/observation';
import { findImportFile, insertImportFile } from '../../data/import-file';
import { askAbout } from '../../operations/ask-about';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { importQuestions } from './import-questions';
import { importField, readImportSetting } from './import-setting';
import { readyCounts } from './ready-counts';
import { readyTapeSheets } from './ready-tape-sheets';

/** Takes a file in whole or not at all: every bad line is named, every question asked at once, and then all is stored in one transaction. */
async function service(context: WriteContext, body: TakeImportInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { planting, farm } = await findSeenPlanting(context, body.plantingId);
  const setting = await readImportSetting(context, planting, farm.timeZone);
  const twin = await findImportFile(tx, { organisationId, importId: operation.thingId });
  if (twin) return takenBefore(twin, body);
  const ready = body.importKind === 'counts' ? readyCounts(context, setting, body.text) : readyTapeSheets(context, setting, body.text);
  if (ready.problems.length > 0) throw new AppError('bad-input', { fields: ready.problems.map(importField) });
  askAbout(importQuestions(ready.questions), operation.confirmations);
  const { lines, records, rowSamples } = ready;
  await insertImportFile(tx, {
    organisationId,
    id: operation.thingId,
    plantingId: planting.id,
    kind: body.importKind,
    fileName: body.fileName,
    lines,
    records,
    operationId: operation.operationId,
    createdBy: actor.personId,
  });
  await ready.store(operation.thingId);
  return { version: 1, result: { lines, records, rowSamples } };
}

/** The same file under the same id, as when the answer got lost, stands once; another one under that id is refused. */
function takenBefore(twin: NonNullable<Awaited<ReturnType<typeof findImportFile>>>, body: TakeImportInput): Written {
  if (twin.plantingId !== body.plantingId || twin.kind !== body.importKind || twin.fileName !== body.fileName) throw new AppError('operation-reused');
  return { version: 1, result: { lines: twin.lines, records: twin.records } };
}

export const takeImport = defineOperation({ kind: 'import.take', version: 1, action: 'imports.write', body: takeImportSchema, service });
