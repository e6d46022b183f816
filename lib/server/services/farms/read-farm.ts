import 'server-only';
import { listFields } from '../../data/field';
import { listPlantings } from '../../data/planting';
import type { ReadContext } from '../../operations/context';
import { readingOf } from '../../operations/reading-columns';
import { findSeenFarm } from './find-seen-farm';

/** A farm with its fields, each with what was last planted in it. */
export async function readFarm(context: ReadContext, farmId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const farm = await findSeenFarm(context, farmId);
  const fields = (await listFields(tx, { organisationId })).filter((each) => each.farmId === farm.id);
  const plantings = await listPlantings(tx, { organisationId });
  return {
    farm,
    fields: fields.map((field) => {
      const own = plantings.filter((each) => each.fieldId === field.id);
      const [newest] = own;
      return {
        id: field.id,
        name: field.name,
        area: readingOf(field.areaTyped, field.areaUnit, field.areaThousandths),
        version: field.version,
        plantings: own.length,
        newest: newest ? { id: newest.id, crop: newest.crop, plantedOn: newest.plantedOn } : null,
      };
    }),
  };
}
