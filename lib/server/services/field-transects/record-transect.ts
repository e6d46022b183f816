import 'server-only';
import { badField } from '@/lib/errors/app-error';
import { recordTransectSchema, type RecordTransectInput } from '@/lib/schemas/field-transect';
import { findFieldTransect, insertFieldTransect, listCorrectionsOfFieldTransect } from '../../data/field-transect';
import { listStrips } from '../../data/strip';
import { findTrialOfPlanting } from '../../data/trial';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertSeasonDay } from '../field-records/assert-season-day';
import { keepRecord } from '../field-records/keep-record';
import { holdPlanting } from '../plantings/hold-planting';

async function service(context: WriteContext, body: RecordTransectInput): Promise<Written> {
  const seen = await holdPlanting(context, body.plantingId);
  assertSeasonDay(context, seen, 'readOn', body.readOn);
  if (body.stripId !== null) await assertStripOf(context, body.plantingId, body.stripId);
  const { plantingId, stripId, readOn, marksRead, marksCovered, replacesId } = body;
  return keepRecord(context, {
    find: findFieldTransect,
    corrections: {
      replacesId,
      list: listCorrectionsOfFieldTransect,
      isHere: (row) => row.plantingId === plantingId,
      shown: (row) => ({ id: row.id, marksRead: row.marksRead, marksCovered: row.marksCovered, personName: row.personName, readOn: row.readOn, recordedAt: row.recordedAt }),
      noSuch: 'There is no such transect of this planting to correct. Open the page again.',
    },
    isSame: (row) =>
      row.plantingId === plantingId && row.stripId === stripId && row.readOn === readOn && row.marksRead === marksRead &&
      row.marksCovered === marksCovered && row.replacesId === replacesId,
    insert: (columns) => insertFieldTransect(context.tx, { ...columns, plantingId, stripId, readOn, marksRead, marksCovered, replacesId }),
  });
}

async function assertStripOf({ tx, actor }: WriteContext, plantingId: string, stripId: string): Promise<void> {
  const { organisationId } = actor;
  const trial = await findTrialOfPlanting(tx, { organisationId, plantingId });
  const strips = trial ? await listStrips(tx, { organisationId, trialId: trial.id }) : [];
  if (!strips.some((strip) => strip.id === stripId)) throw badField('stripId', 'This strip is not in the planting. Choose one that is.');
}

export const recordTransect = defineOperation({ kind: 'transect.record', version: 1, action: 'observations.write', body: recordTransectSchema, service });
