import type { Chance } from './chance';
import type { Entry, Made } from './entry';
import type { TakenPhoto } from './photos';
import type { Scene } from './scene';

export type PhoneOfScout = { personId: string; deviceId: string; made: Made[] };

type Visit = { id: string; personId: null; visitedOn: string; visitedAt: string; marker: string | null };
type Counted = { thingId: string; operationId: string; body: Record<string, unknown> };

const zone = 'America/Chicago';
const plantsMost = 33;
/** These rows of each planting are counted by every phone; each phone has a few more to itself, counted as "new since". */
const ownRows = 4;

const dayAfterPlanting = (days: number) => new Date(Date.UTC(2026, 4, 7 + days)).toISOString().slice(0, 10);

/** Plants up at a row rise with the day and never fall, so that counts in any order of arrival raise no question. */
const plantsUp = (day: number) => Math.max(0, Math.min(plantsMost, Math.floor((day - 4) * 1.6)));

/**
 * Everything one phone enters: counts of shared rows and of its own, corrections, in-row cover, tape sheets, depths, crust,
 * markers, notes and withdrawals, with ids of the phone's making and its own sequence.
 */
export function makeEntries(scene: Scene, index: number, entries: number, chance: Chance, photos: readonly TakenPhoto[] = []): PhoneOfScout {
  const scout = scene.scouts[index % scene.scouts.length];
  const planting = scene.plantings[index % scene.plantings.length];
  if (!scout || !planting) throw new Error('There is a scout and a planting for every phone.');
  const phonesHere = Math.ceil(scene.scouts.length / scene.plantings.length);
  const place = Math.floor(index / scene.plantings.length);
  const shared = planting.rowIds.slice(0, planting.rowIds.length - ownRows * phonesHere);
  const own = planting.rowIds.slice(shared.length + place * ownRows, shared.length + (place + 1) * ownRows);
  const deviceId = chance.id();
  const visitsOf = new Map<string, number>();
  const newPlantsOf = new Map<string, number>();
  const tapedOf = new Map<string, number>();
  const lastVisit = new Map<string, Visit>();
  const open: Counted[] = [];
  const made: Made[] = [];

  const visitAt = (rowId: string): { visit: Visit; day: number } => {
    const visits = (visitsOf.get(rowId) ?? 0) + 1;
    visitsOf.set(rowId, visits);
    const day = 4 + visits;
    // Each phone has a minute of its own, so that no two visits of a row are one.
    const visitedAt = `${String(7 + (visits % 9)).padStart(2, '0')}:${String((index * 2) % 60).padStart(2, '0')}`;
    const visit = { id: chance.id(), personId: null, visitedOn: dayAfterPlanting(day), visitedAt, marker: chance.happens(0.5) ? chance.pick(['red', 'blue', '3']) : null };
    lastVisit.set(rowId, visit);
    return { visit, day };
  };

  const keep = (kind: string, body: Record<string, unknown>, more: { restsOn?: string; meant?: Record<string, unknown>; on: string; at?: string; thingId?: string }) => {
    const entry: Entry = {
      operationId: chance.id(), organisationId: scene.organisationId, personId: scout.personId, deviceId, deviceSequence: made.length + 1, kind, version: 1,
      thingId: more.thingId ?? chance.id(), baseVersion: null, follows: null, body, occurred: { date: more.on, time: more.at ?? '12:00', zone }, confirmations: [],
    };
    made.push({ entry, restsOn: more.restsOn ?? null, meant: more.meant ?? {} });
    return entry;
  };

  const count = () => {
    const asNew = chance.happens(0.2);
    const rowSampleId = chance.pick(asNew ? own : shared);
    const { visit, day } = visitAt(rowSampleId);
    let plants = plantsUp(day);
    if (asNew) {
      const before = newPlantsOf.get(rowSampleId) ?? 0;
      plants = Math.min(chance.whole(0, 3), plantsMost - before);
      newPlantsOf.set(rowSampleId, before + plants);
    }
    const body = { rowSampleId, visit, countedAs: asNew ? 'new' : 'so-far', plants, doubtful: chance.whole(0, Math.min(plants, 2)), replacesId: null };
    const { thingId, operationId } = keep('count.record', body, { on: visit.visitedOn, at: visit.visitedAt });
    open.push({ thingId, operationId, body });
  };

  const correct = () => {
    const counted = open.splice(chance.whole(0, open.length - 1), 1)[0];
    if (!counted) return count();
    const { plants, visit } = counted.body as { plants: number; visit: Visit };
    const body = { ...counted.body, doubtful: Math.min(plants, 3), replacesId: counted.thingId };
    keep('count.record', body, { restsOn: counted.operationId, on: visit.visitedOn, at: visit.visitedAt });
  };

  const takeBack = () => {
    const counted = open.splice(chance.whole(0, open.length - 1), 1)[0];
    if (!counted) return count();
    const body = { targetKind: 'count', targetId: counted.thingId, reason: chance.pick(['Counted the wrong row', 'Typed twice']) };
    keep('observation.withdraw', body, { restsOn: counted.operationId, on: dayAfterPlanting(40) });
  };

  const residue = () => {
    const marksRead = chance.whole(50, 100);
    const readOn = dayAfterPlanting(chance.whole(0, 30));
    keep('residue.record', { rowSampleId: chance.pick([...shared, ...own]), readOn, marksRead, marksCovered: chance.whole(0, marksRead) }, { on: readOn });
  };

  const tape = () => {
    const rowSampleId = chance.pick(shared);
    const sheets = (tapedOf.get(rowSampleId) ?? 0) + 1;
    tapedOf.set(rowSampleId, sheets);
    // Two sheets of one row, person and day would be asked about.
    const visit = { id: chance.id(), personId: null, visitedOn: dayAfterPlanting(60 + sheets), visitedAt: '15:10', marker: chance.happens(0.5) ? 'white' : null };
    const { places, thousandths } = readTape(chance, visit.marker);
    keep('tape-sheet.record', { rowSampleId, visit, tapeUnit: 'in', places, replacesId: null }, { meant: { thousandths }, on: visit.visitedOn, at: visit.visitedAt });
  };

  const depth = () => {
    const rowSampleId = chance.pick(shared);
    const { visit } = visitAt(rowSampleId);
    const eighths = Array.from({ length: 10 }, () => chance.whole(8, 23));
    const depths = eighths.map((each) => (each % 8 === 0 ? String(each / 8) : chance.happens(0.5) ? `${Math.floor(each / 8)} ${each % 8}/8` : String(each / 8)));
    keep('depth.record', { rowSampleId, visit, unit: 'in', depths, replacesId: null }, { meant: { thousandths: eighths.map((each) => each * 125) }, on: visit.visitedOn, at: visit.visitedAt });
  };

  const crust = () => {
    const rowSampleId = chance.pick(shared);
    const { visit } = visitAt(rowSampleId);
    const body = { rowSampleId, visit, sproutsSound: chance.whole(0, 20), sproutsDead: chance.whole(0, 10), crust: chance.pick(['none', 'thin', 'thick']), replacesId: null };
    keep('crust.record', body, { on: visit.visitedOn, at: visit.visitedAt });
  };

  const markers = () => {
    const happenedOn = dayAfterPlanting(chance.whole(5, 30));
    keep('markers.record', { rowSampleId: chance.pick(shared), happenedOn, event: chance.pick(['set', 'taken-up']), markers: chance.whole(1, 40), replacesId: null }, { on: happenedOn });
  };

  const note = () => {
    const notedOn = dayAfterPlanting(chance.whole(5, 30));
    const text = chance.pick(['Deer in the east end.', 'Reihe 7: Kruste, “dünn” — ½ Zoll', 'Water stood here;\ntwo rows drowned.', 'ряд 3, 雨のあと']);
    keep('note.record', { plantingId: planting.id, rowSampleId: chance.happens(0.5) ? chance.pick(shared) : null, notedOn, notedAt: '14:05', text }, { on: notedOn, at: '14:05' });
  };

  const photograph = ({ photoId, bytes, sha256 }: TakenPhoto) => {
    const takenOn = dayAfterPlanting(chance.whole(5, 30));
    const place = chance.happens(0.5) ? { latitude: 41.5 + chance.whole(0, 999) / 1000, longitude: -93.5 + chance.whole(0, 999) / 1000, accuracyMeters: chance.whole(3, 60) } : null;
    const body = { plantingId: planting.id, rowSampleId: chance.pick(shared), digId: null, takenOn, takenAt: '09:20', place, sha256, bytes: bytes.length };
    keep('photo.record', body, { thingId: photoId, on: takenOn, at: '09:20' });
  };

  for (const photo of photos) photograph(photo);
  for (let n = 0; n < entries; n += 1) {
    const share = chance.next();
    if (share < 0.45) count();
    else if (share < 0.52) correct();
    else if (share < 0.6) takeBack();
    else if (share < 0.74) residue();
    else if (share < 0.84) tape();
    else if (share < 0.89) depth();
    else if (share < 0.93) crust();
    else if (share < 0.97) markers();
    else note();
  }
  return { personId: scout.personId, deviceId, made };
}

/** Up to thirty plants along the tape, in eighths of an inch, typed in the ways people type them. */
function readTape(chance: Chance, marker: string | null) {
  const places: Record<string, unknown>[] = [];
  const thousandths: number[] = [];
  let eighths = chance.whole(8, 40);
  const plants = chance.whole(10, 30);
  for (let n = 0; n < plants; n += 1) {
    const whole = Math.floor(eighths / 8);
    const rest = eighths % 8;
    const typed = rest === 0 ? String(whole) : chance.happens(0.5) ? `${whole} ${rest}/8` : String(whole + rest / 8);
    places.push({ typed, kind: chance.pick(['plant', 'plant', 'plant', 'late', 'missing']), marker: chance.happens(0.5) ? marker : null, leafStage: chance.happens(0.4) ? chance.pick([1, 2, 2.5, 3]) : null });
    thousandths.push(eighths * 125);
    eighths += chance.whole(20, 52);
  }
  return { places, thousandths };
}
