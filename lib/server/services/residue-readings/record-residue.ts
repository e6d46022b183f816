import 'server-only';
import { Temporal } from 'temporal-polyfill';
import { AppError, badField } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { recordResidueSchema, type RecordResidueInput } from '@/lib/schemas/observation';
import { findResidueReading, insertResidueReading } from '../../data/residue-reading';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { visitFacts } from '../counts/visit-facts';
import { findSeenRowSample } from '../row-samples/find-seen-row-sample';

async function service(context: WriteContext, body: RecordResidueInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { rowSample, planting, farm } = await findSeenRowSample(context, body.rowSampleId);
  const { today } = visitFacts(context, planting, farm.timeZone);
  if (today !== null && body.readOn > today) throw badField('readOn', `This day has not come yet; today is ${dateText(today)}. Check the date.`);
  // Cover is read before planting as well as after, within the same season.
  const planted = Temporal.PlainDate.from(planting.plantedOn);
  if (Math.abs(planted.until(body.readOn).days) > 366) {
    throw badField('readOn', `This is more than a year from planting, ${dateText(planting.plantedOn)}. Check the year.`);
  }
  const { readOn, marksRead, marksCovered } = body;
  const values = { rowSampleId: rowSample.id, readOn, marksRead, marksCovered };
  if (await insertResidueReading(tx, { id: operation.thingId, ...values, ...originColumns(context) })) return { version: 1 };
  const twin = await findResidueReading(tx, { organisationId: actor.organisationId, residueReadingId: operation.thingId });
  const same = twin?.rowSampleId === rowSample.id && twin.readOn === readOn && twin.marksRead === marksRead && twin.marksCovered === marksCovered;
  if (!same) throw new AppError('operation-reused');
  return { version: 1 };
}

export const recordResidue = defineOperation({ kind: 'residue.record', version: 1, action: 'observations.write', body: recordResidueSchema, service });
