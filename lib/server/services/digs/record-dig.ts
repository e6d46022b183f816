import 'server-only';
import { digQuestions } from '@/lib/schemas/dig-questions';
import { recordDigSchema, type RecordDigInput } from '@/lib/schemas/dig';
import { findDig, insertDig, listCorrectionsOfDig } from '../../data/dig';
import { askAbout } from '../../operations/ask-about';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { readingColumns } from '../../operations/reading-columns';
import { readObservations } from '../counts/read-observations';
import { holdVisitedRow } from '../field-records/hold-visited-row';
import { keepRecord } from '../field-records/keep-record';

async function service(context: WriteContext, body: RecordDigInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { rowSample, planting, visitColumns, keepVisit, isSameVisit } = await holdVisitedRow(context, body);
  const { pairId, plant, where: dugIn, placeTyped, depth, residue, moisture, crust, found, note, replacesId } = body;
  const plain = { pairId, plant, dugIn, placeTyped, residue, moisture, crust, note, replacesId };
  return keepRecord(context, {
    find: findDig,
    corrections: {
      replacesId,
      list: listCorrectionsOfDig,
      isHere: (row) => row.rowSampleId === rowSample.id,
      shown: (row) => ({ id: row.id, plant: row.plant, found: row.found, depth: row.depthTyped, personName: row.personName, visitedOn: row.visitedOn, recordedAt: row.recordedAt }),
      noSuch: 'There is no such dig of this row to correct. Open the sheet again.',
    },
    isSame: (row) =>
      isSameVisit(row) && Object.entries(plain).every(([key, value]) => row[key as keyof typeof plain] === value) &&
      row.depthTyped === (depth?.typed ?? null) && row.depthUnit === (depth?.unit ?? null) && row.found.join() === found.join(),
    before: async () => {
      const { counts } = await readObservations(tx, { organisationId: actor.organisationId, plantingId: planting.id, rowSampleId: rowSample.id });
      const planted = { on: planting.plantedOn, at: planting.plantedAt };
      askAbout(digQuestions({ label: rowSample.label, planted }, { where: dugIn, visitedOn: body.visit.visitedOn }, counts), operation.confirmations);
      await keepVisit();
    },
    insert: (columns) => insertDig(tx, { ...columns, ...visitColumns, ...plain, found, ...readingColumns('depth', depth) }),
  });
}

export const recordDig = defineOperation({ kind: 'dig.record', version: 1, action: 'observations.write', body: recordDigSchema, service });
