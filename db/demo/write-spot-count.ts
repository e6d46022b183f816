import { randomStream } from '@/lib/agronomy/random';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { spotCountSeed } from './chosen-seeds';
import { fieldIds } from './demo-farms';
import { demoId } from './demo-id';
import type { DemoWriter } from './demo-writer';
import { emergencePattern } from './simulate-emergence';
import { simulateRow } from './simulate-row';

export const spotPlantingId = demoId('quillfern/planting/spot-count');

const plantedOn = '2026-05-02';
const countedOn = '2026-05-22';
const by = 'scout-one';

/** What is true of the third field: a sound stand in 22-inch rows, of which 23 ft 9 in is 1/1000 acre. */
const truth = { seedsPerAcre: 35_000, rowSpacingInches: 22, rowLengthInches: 285, standShare: 0.94, daysAfterPlanting: 20, places: 6 };

/** A spot count without settings: six places of one field, looked at once. */
export async function writeSpotCount(write: DemoWriter): Promise<void> {
  const places = simulatePlaces();
  await write({ kind: 'planting.add', thingId: spotPlantingId, by: 'agronomist', on: plantedOn, body: plantingBody() });
  const samples = places.map(({ id, label }) => ({
    id, stripId: null, zoneId: null, label, planterRow: null, length: { typed: '23 ft 9 in' }, startEnd: 'mark', farEnd: 'mark',
  }));
  await write({ kind: 'row-samples.add', thingId: spotPlantingId, by: 'agronomist', on: countedOn, body: { plantingId: spotPlantingId, samples } });
  for (const { id: rowSampleId, plantsUp } of places) {
    const visit = { id: demoId(`${rowSampleId}/visit`), personId: null, visitedOn: countedOn, visitedAt: '09:30', marker: null };
    const body = { rowSampleId, visit, countedAs: 'so-far', plants: plantsUp, doubtful: 0, replacesId: null };
    await write({ kind: 'count.record', thingId: demoId(`${rowSampleId}/count`), by, on: countedOn, body, seenSo: ['more-plants-than-seeds'] });
  }
}

function simulatePlaces() {
  const { seedsPerAcre, rowSpacingInches, rowLengthInches, standShare, daysAfterPlanting } = truth;
  const stream = randomStream(spotCountSeed);
  return Array.from({ length: truth.places }, (_, index) => {
    const seeds = simulateRow(
      {
        lengthInches: rowLengthInches,
        theoreticalSpacingInches: theoreticalSpacingInches(seedsPerAcre, rowSpacingInches),
        emergedShare: standShare,
        lossRunSeedsMean: 1.6,
        pattern: emergencePattern({ halfUpDays: 10.5, spreadDays: 2.6, lateShare: 0.02 }),
        shiftDays: 0,
        rowSdDays: 0,
      },
      stream,
    );
    const plantsUp = seeds.filter(({ emergedDays }) => emergedDays !== null && emergedDays <= daysAfterPlanting).length;
    return { id: demoId(`quillfern/spot/row/${index + 1}`), label: `C${index + 1}`, plantsUp };
  });
}

function plantingBody() {
  return {
    fieldId: fieldIds.creekEighty,
    plantedOn,
    plantedAt: null,
    crop: 'corn',
    rowSpacing: { typed: '22' },
    seedingRate: { typed: '35,000' },
    tagGermination: { typed: '95' },
    intendedStand: { typed: '33,000' },
    fullYield: null,
    previousCrop: 'soybean',
    tillage: 'strip-till',
    slowAfterDays: 2,
    lateAfterDays: 7,
    veryLateAfterDays: 14,
    zones: [],
  };
}
