import 'server-only';
import { listPlantings } from '../../data/planting';
import { listPlantingProgress } from '../../data/planting-progress';
import type { ReadContext } from '../../operations/context';
import { readingOf } from '../../operations/reading-columns';
import { plantingHead } from '../plantings/planting-head';
import { findSeenField } from './find-seen-field';

/** A field with its plantings, newest first, and how far each was counted. */
export async function readField(context: ReadContext, fieldId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const { field, farm } = await findSeenField(context, fieldId);
  const plantings = (await listPlantings(tx, { organisationId })).filter((each) => each.fieldId === field.id);
  const progress = await listPlantingProgress(tx, { organisationId, plantingIds: plantings.map((each) => each.id) });
  return {
    farm: { id: farm.id, name: farm.name },
    field: {
      id: field.id,
      name: field.name,
      area: readingOf(field.areaTyped, field.areaUnit, field.areaThousandths),
      version: field.version,
    },
    plantings: plantings.map((planting) => {
      const { rowSamples = 0, rowSamplesVisited = 0, lastVisitOn = null } = progress.find((each) => each.plantingId === planting.id) ?? {};
      return { ...plantingHead(planting, field, farm), rowSamples, rowSamplesVisited, lastVisitOn };
    }),
  };
}
