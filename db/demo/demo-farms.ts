import { demoId } from './demo-id';
import type { DemoWriter } from './demo-writer';

export const farmIds = {
  larkspur: demoId('quillfern/larkspur-bottom'),
  crookedElm: demoId('quillfern/crooked-elm'),
  widowsQuarter: demoId('quillfern/widows-quarter'),
};

export const fieldIds = {
  northHalf: demoId('quillfern/north-half'),
  upperFlats: demoId('quillfern/upper-flats'),
  creekEighty: demoId('quillfern/creek-eighty'),
};

/** Each grower has a farm of their own; each scout walks two of the three. */
export const farmsOfPeople: Record<string, readonly string[]> = {
  'scout-one': [farmIds.larkspur, farmIds.widowsQuarter],
  'scout-two': [farmIds.larkspur, farmIds.crookedElm],
  'grower-one': [farmIds.larkspur],
  'grower-two': [farmIds.crookedElm],
};

const farms = [
  { farmId: farmIds.larkspur, name: 'Larkspur Bottom', fieldId: fieldIds.northHalf, field: 'North half', acres: '78' },
  { farmId: farmIds.crookedElm, name: 'Crooked Elm', fieldId: fieldIds.upperFlats, field: 'Upper flats', acres: '62' },
  { farmId: farmIds.widowsQuarter, name: 'Widow’s Quarter', fieldId: fieldIds.creekEighty, field: 'Creek eighty', acres: '80' },
];

/** The crop service's three invented farms, each with one field. */
export async function writeFarms(write: DemoWriter): Promise<void> {
  for (const { farmId, name, fieldId, field, acres } of farms) {
    await write({ kind: 'farm.add', thingId: farmId, body: { name, timeZone: 'America/Chicago' }, by: 'owner', on: '2026-03-02' });
    await write({ kind: 'field.add', thingId: fieldId, body: { farmId, name: field, area: { typed: acres } }, by: 'agronomist', on: '2026-03-03' });
  }
}
