import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { plantingSchema, type PlantingInput } from '@/lib/schemas/planting';
import { updatePlanting } from '../../data/planting';
import { insertZones, listZones, removeZones, updateZone } from '../../data/planting-zone';
import { listRowSamples } from '../../data/row-sample';
import { findFirstVisit } from '../../data/planting-progress';
import { askAbout } from '../../operations/ask-about';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { readingColumns, readingOf } from '../../operations/reading-columns';
import { dateQuestions } from './date-questions';
import { holdPlanting } from './hold-planting';
import { latestPlantingDay } from './latest-planting-day';
import { plantingColumns } from './planting-columns';
import { zoneQuestions } from './zone-questions';

async function service(context: WriteContext, body: PlantingInput): Promise<Written> {
  const { tx, actor, operation, clock } = context;
  const { organisationId } = actor;
  const { planting, field, farm } = await holdPlanting(context, operation.thingId);
  assertVersion(planting.version, operation.baseVersion);
  if (body.plantedOn > latestPlantingDay(clock.today(farm.timeZone))) {
    throw badField('plantedOn', 'This planting date is more than a year ahead. Check the year.');
  }
  const firstVisit = await findFirstVisit(tx, { organisationId, plantingId: planting.id });
  askAbout(
    [
      ...dateQuestions(planting, body, firstVisit),
      ...zoneQuestions(body.zones, readingOf(field.areaTyped, field.areaUnit, field.areaThousandths)),
    ],
    operation.confirmations,
  );
  const changed = await updatePlanting(tx, { organisationId, plantingId: planting.id, version: planting.version, values: plantingColumns(body) });
  // Somebody was quicker between the look and the change.
  if (!changed) throw new AppError('conflict', { standingVersion: planting.version + 1 });
  await settleZones(context, planting.id, body.zones);
  return { version: planting.version + 1 };
}

/** Brings the zones to what the form says; one with row samples in it stays. */
async function settleZones(context: WriteContext, plantingId: string, zones: PlantingInput['zones']) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const standing = await listZones(tx, { organisationId, plantingId });
  const gone = standing.filter((zone) => !zones.some((each) => each.id === zone.id));
  if (gone.length > 0) {
    const samples = await listRowSamples(tx, { organisationId, plantingId });
    const used = gone.find((zone) => samples.some((sample) => sample.zoneId === zone.id));
    if (used) throw new AppError('in-use', { sentence: `Row samples lie in the zone ${used.name}, so it stays. Move those first.` });
  }
  await removeZones(tx, { organisationId, zoneIds: gone.map((zone) => zone.id) });
  const added = zones.filter((zone) => !standing.some((each) => each.id === zone.id));
  await insertZones(tx, added.map((zone) => ({ id: zone.id, plantingId, name: zone.name, ...readingColumns('area', zone.area), ...originColumns(context) })));
  for (const zone of zones) {
    const before = standing.find((each) => each.id === zone.id);
    if (before && (before.name !== zone.name || before.areaTyped !== zone.area.typed || before.areaUnit !== zone.area.unit)) {
      await updateZone(tx, { organisationId, zoneId: zone.id, values: { name: zone.name, ...readingColumns('area', zone.area) } });
    }
  }
}

export const changePlanting = defineOperation({ kind: 'planting.change', version: 1, action: 'plantings.write', body: plantingSchema, service });
