import { demoId } from './demo-id';

type Send = (operation: { kind: string; thingId: string; on: string; body: Record<string, unknown> }) => Promise<void>;
type Place = { farmId: string; fieldId: string; plantingId: string; rowSampleId: string };

/** One of everything that a phone records beside counts, with the organisation's own word wherever a person writes. */
export async function writeOtherFieldRecords(send: Send, word: string, { farmId, fieldId, plantingId, rowSampleId }: Place, on: string): Promise<void> {
  const idOf = (name: string) => demoId(`${plantingId}/${name}`);
  const record = (kind: string, name: string, body: Record<string, unknown>) => send({ kind, thingId: idOf(name), on, body });
  const visit = { id: idOf('visit of field records'), personId: null, visitedOn: on, visitedAt: '09:15', marker: word };
  const replacesId = null;
  await record('depth.record', 'depth', { rowSampleId, visit, unit: 'in', depths: ['1 3/4', '2'], replacesId });
  await record('dig.record', 'dig', {
    rowSampleId, visit, pairId: idOf('pair'), plant: 'late', where: 'twin-length', placeTyped: `68 ${word}`, depth: { typed: '2 1/2', unit: 'in' },
    residue: 'pinned', moisture: 'wet', crust: 'thin', found: ['residue-in-furrow'], note: `${word} dig`, replacesId,
  });
  await record('crust.record', 'crust', { rowSampleId, visit, sproutsSound: 5, sproutsDead: 1, crust: 'thin', replacesId });
  await record('transect.record', 'transect', { plantingId, stripId: null, readOn: on, marksRead: 100, marksCovered: 37, replacesId });
  await record('condition.record', 'condition', { plantingId, rowSampleId, observedOn: on, observedAt: null, growthStage: 'V2', soilTemperature: { typed: '58', unit: 'F' }, soilMoisture: 'moist', replacesId });
  await record('note.record', 'note', { plantingId, rowSampleId: null, notedOn: on, notedAt: null, text: `${word} note of the planting` });
  await record('note.record', 'note of the row', { plantingId, rowSampleId, notedOn: on, notedAt: null, text: `${word} note of the row` });
  await record('markers.record', 'markers', { rowSampleId, happenedOn: on, event: 'set', markers: 29, replacesId });
  await record('entry-restriction.record', 'restriction', { fieldId, product: `${word} product`, endedOn: on, endedAt: '06:30', hours: 12, replacesId });
  await record('entry-exception.record', 'exception', { restrictionId: idOf('restriction'), enteredOn: on, exception: `${word} exception`, equipment: `${word} gloves` });
  await record('spot-count.start', 'spot count', {
    farmId, field: { id: idOf('spot field'), name: `${word} spot field` }, plantedOn: '2026-05-06', crop: 'corn', rowSpacing: { typed: '30' },
    seedingRate: { typed: '33,000' }, intendedStand: { typed: '30,500' },
  });
  await record('spot-place.add', 'spot place', { plantingId: idOf('spot count'), zoneId: null, label: word, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' });
}
