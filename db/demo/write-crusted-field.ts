import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { fieldIds } from './demo-farms';
import { demoId } from './demo-id';
import type { DemoWriter } from './demo-writer';
import { inParallel } from './in-parallel';
import { observeTape } from './observe-row';
import { crustedTruth, simulateCrustedField, type LookedAtPlace } from './simulate-crusted-field';

export const crustedPlantingId = demoId('quillfern/planting/crusted');
export const zoneIdOf = (key: LookedAtPlace['zoneKey']) => demoId(`quillfern/zone/${key}`);

const scout = 'scout-two';
const rowSampleIdOf = (place: LookedAtPlace) => demoId(`quillfern/crusted/row/${place.number}`);

/** Places whose plants were read off the tape as well, two in each part of the field. */
const tapedPlaces = [1, 3, 6, 9];

/** The crusted field: its planting with two zones, twelve places counted on one day, and some of them on the tape. */
export async function writeCrustedField(write: DemoWriter): Promise<void> {
  const places = simulateCrustedField();
  await write({ kind: 'planting.add', thingId: crustedPlantingId, by: 'agronomist', on: crustedTruth.plantedOn, body: plantingBody() });
  const samples = places.map((place) => ({
    id: rowSampleIdOf(place),
    stripId: null,
    zoneId: zoneIdOf(place.zoneKey),
    label: `P${place.number}`,
    planterRow: null,
    length: { typed: '17 ft 5 in' },
    startEnd: 'mark',
    farEnd: 'mark',
  }));
  const body = { plantingId: crustedPlantingId, samples };
  await write({ kind: 'row-samples.add', thingId: crustedPlantingId, by: 'agronomist', on: crustedTruth.lookedAtOn, body });
  await inParallel(places, 4, (place) => writePlace(write, place));
}

function plantingBody() {
  return {
    fieldId: fieldIds.upperFlats,
    plantedOn: crustedTruth.plantedOn,
    plantedAt: null,
    crop: 'corn',
    rowSpacing: { typed: '30' },
    seedingRate: { typed: '34,000' },
    tagGermination: { typed: '95' },
    intendedStand: { typed: '31,000' },
    fullYield: { typed: '200' },
    previousCrop: 'soybean',
    tillage: 'conventional',
    slowAfterDays: 2,
    lateAfterDays: 7,
    veryLateAfterDays: 14,
    zones: crustedTruth.zones.map(({ key, name, acres }) => ({ id: zoneIdOf(key), name, area: { typed: String(acres) } })),
  };
}

async function writePlace(write: DemoWriter, place: LookedAtPlace): Promise<void> {
  const { lookedAtOn, daysAfterPlanting, rowLengthInches, seedsPerAcre, rowSpacingInches } = crustedTruth;
  const rowSampleId = rowSampleIdOf(place);
  const visit = { id: demoId(`${rowSampleId}/visit`), personId: null, visitedOn: lookedAtOn, visitedAt: null, marker: null };
  const counted = { rowSampleId, visit, countedAs: 'so-far', plants: place.plantsUp, doubtful: place.doubtful, replacesId: null };
  await write({ kind: 'count.record', thingId: demoId(`${rowSampleId}/count`), by: scout, on: lookedAtOn, body: counted });
  if (!tapedPlaces.includes(place.number)) return;
  const length = { lengthInches: rowLengthInches, theoreticalSpacingInches: theoreticalSpacingInches(seedsPerAcre, rowSpacingInches) };
  const read = observeTape(place.seeds, [{ day: daysAfterPlanting, marker: '', plantsUp: place.plantsUp }], length);
  // One look sets no markers: when a plant came up is not known.
  const places = read.map((each) => ({ ...each, kind: each.kind === 'late' ? ('plant' as const) : each.kind, marker: null }));
  const body = { rowSampleId, visit, tapeUnit: 'in', places, replacesId: null };
  await write({ kind: 'tape-sheet.record', thingId: demoId(`${rowSampleId}/tape`), by: scout, on: lookedAtOn, body, seenSo: ['more-places-than-seeds'] });
}
