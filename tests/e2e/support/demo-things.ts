import { farmIds, fieldIds } from '@/db/demo/demo-farms';
import { demoId } from '@/db/demo/demo-id';
import { trialId, trialPlantingId } from '@/db/demo/trial-ids';
import { otherIdsOf } from '@/db/demo/write-other-organisation';

/** One thing of each noun, as an address or an operation names them. */
export type Things = {
  farm: string;
  field: string;
  planting: string;
  zone: string;
  rowSample: string;
  count: string;
  setting: string;
  trial: string;
  person: string;
};

const other = otherIdsOf({ key: 'marrowglass' });
const never = (noun: string) => demoId(`nothing was ever made under this name: ${noun}`);

/** The organisation that the visitors belong to, one they do not belong to, and one that never was. */
export const organisations = { own: demoId('quillfern'), another: demoId('marrowglass'), never: never('organisation') };

/**
 * The same nouns four times: on the farm that the table's scout and grower are attached to, on one that they are not, in an
 * organisation that is not theirs, and under ids that nothing was ever given.
 */
export const things = {
  own: {
    farm: farmIds.larkspur,
    field: fieldIds.northHalf,
    planting: trialPlantingId,
    zone: never('zone of the trial'),
    rowSample: demoId('quillfern/row/1-1'),
    count: demoId(`${demoId('quillfern/row/1-1')}/count/8`),
    setting: demoId('quillfern/setting/raised'),
    trial: trialId,
    person: demoId('quillfern/scout-two'),
  },
  notAssigned: {
    farm: farmIds.crookedElm,
    field: fieldIds.upperFlats,
    planting: demoId('quillfern/planting/crusted'),
    zone: demoId('quillfern/zone/low'),
    rowSample: demoId('quillfern/crusted/row/1'),
    count: demoId(`${demoId('quillfern/crusted/row/1')}/count`),
    setting: demoId('quillfern/setting/raised'),
    trial: trialId,
    person: demoId('quillfern/grower-two'),
  },
  another: {
    farm: other.farmId,
    field: other.fieldId,
    planting: other.plantingId,
    zone: other.zoneId,
    rowSample: other.rowSampleId,
    count: other.countId,
    setting: other.settingIds[0] ?? '',
    trial: other.trialId,
    person: demoId('marrowglass/owner'),
  },
  never: {
    farm: never('farm'),
    field: never('field'),
    planting: never('planting'),
    zone: never('zone'),
    rowSample: never('row sample'),
    count: never('count'),
    setting: never('setting'),
    trial: never('trial'),
    person: never('person'),
  },
} satisfies Record<string, Things>;

export type Place = keyof typeof things;
export const places = Object.keys(things) as Place[];
