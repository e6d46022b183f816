import { demoId } from './demo-id';
import type { DemoWriter } from './demo-writer';
import { crustedTruth } from './simulate-crusted-field';
import { crustedPlantingId, zoneIdOf } from './write-crusted-field';

/**
 * Invented amounts, said to be so on the sheet itself; no price or cost of any year or place. With them the field as a whole
 * and its high ground are kept; on the low ground replanting comes out a little ahead, and four counts leave both open.
 */
const inputs = {
  typedIn: 'us',
  fullYield: { typed: '200' },
  pricePerBushel: '4.20',
  replantOn: '2026-05-28',
  replantStand: { typed: '30,000' },
  costs: [
    { label: 'Taking out the old stand (invented)', dollarsPerAcre: '8' },
    { label: 'Planting again (invented)', dollarsPerAcre: '15' },
    { label: 'Seed after the supplier’s replant terms (invented)', dollarsPerAcre: '12' },
  ],
  extraDryingPerAcre: '9',
  insurancePaymentPerAcre: '0',
  gapLossPercent: 2,
  unevenLossPercent: 0,
  poorSecondStandChancePercent: 10,
  poorSecondStandYieldPercent: 75,
};

/** The agronomist's sum for the whole crusted field and for each part of it, saved and not yet decided on. */
export async function writeReplantSheets(write: DemoWriter): Promise<void> {
  for (const zoneId of [null, ...crustedTruth.zones.map(({ key }) => zoneIdOf(key))]) {
    await write({
      kind: 'replant-sheet.save',
      thingId: demoId(`quillfern/replant-sheet/${zoneId ?? 'whole'}`),
      by: 'agronomist',
      on: '2026-05-26',
      body: { plantingId: crustedPlantingId, zoneId, inputs },
    });
  }
}
