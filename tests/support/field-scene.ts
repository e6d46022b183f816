import { v7 } from 'uuid';
import { inOrganisation } from '@/db/connection';
import { readRestrictions } from '@/lib/server/services/entry-restrictions/read-restrictions';
import { readFieldRecords } from '@/lib/server/services/field-records/read-field-records';
import type { CountScene } from './count-scene';

export type Sent = Record<string, unknown>;
export const visit = (more: Sent = {}) => ({ id: v7(), personId: null, visitedOn: '2026-05-18', visitedAt: '07:30', marker: null, ...more });

/** One kind of record of the field: a sound body, how it is withdrawn, what a change of it looks like, and what cannot be. */
export type FieldKind = {
  kind: string;
  targetKind: string;
  body: (scene: CountScene) => Sent;
  /** Another content that is just as sound. */
  changed: Sent;
  /** Whether it is corrected, or taken back and written anew. */
  corrected: boolean;
  bad: readonly (readonly [what: string, spoiled: Sent, path: string])[];
};

const fieldOfScene = new WeakMap<CountScene, string>();
/** A field of the scene's farm to be sprayed; made where the kind is used first. */
export async function sprayedField(counted: CountScene): Promise<string> {
  const fieldId = v7();
  await counted.scene.must('owner', 'field.add', fieldId, { farmId: counted.scene.farmId, name: `Sprayed ${fieldId.slice(-4)}`, area: null });
  fieldOfScene.set(counted, fieldId);
  return fieldId;
}
export const sprayed = (counted: CountScene) => fieldOfScene.get(counted) ?? '';

export const fieldKinds: readonly FieldKind[] = [
  {
    kind: 'depth.record', targetKind: 'depth-reading', corrected: true,
    body: (counted) => ({ rowSampleId: counted.row('A-1'), visit: visit(), unit: 'in', depths: ['1 3/4', '2', '2.25'], replacesId: null }),
    changed: { depths: ['1 3/4', '2', '2 1/2'] },
    bad: [
      ['deeper than six inches', { depths: ['2', '6 1/8'] }, 'depths.1'],
      ['below zero', { depths: ['-1'] }, 'depths.0'],
      ['in letters', { depths: ['2', 'deep'] }, 'depths.1'],
      ['in another unit than said', { depths: ['5 cm'] }, 'depths.0'],
      ['without any', { depths: [] }, 'depths'],
      ['with thirty-one', { depths: Array.from({ length: 31 }, () => '2') }, 'depths'],
      ['in feet', { unit: 'ft' }, 'unit'],
      ['before planting', { visit: visit({ visitedOn: '2026-05-06' }) }, 'visit.visitedOn'],
      ['of a day to come', { visit: visit({ visitedOn: '2026-05-21' }) }, 'visit.visitedOn'],
    ],
  },
  {
    kind: 'dig.record', targetKind: 'dig', corrected: true,
    body: (counted) => ({
      rowSampleId: counted.row('A-1'), visit: visit(), pairId: v7(), plant: 'late', where: 'twin-length', placeTyped: '68 1/2', depth: { typed: '2 1/2', unit: 'in' },
      residue: 'beside-seed', moisture: 'moist', crust: 'thin', found: ['twisted-shoot', 'residue-in-furrow'], note: 'By the wheel track', replacesId: null,
    }),
    changed: { found: ['rotted'] },
    bad: [
      ['of no plant', { plant: 'weed' }, 'plant'],
      ['somewhere else', { where: 'next-field' }, 'where'],
      ['deeper than six inches', { depth: { typed: '7', unit: 'in' } }, 'depth.typed'],
      ['with a finding of no list', { found: ['sound', 'gnome'] }, 'found.1'],
      ['with a finding twice', { found: ['sound', 'sound'] }, 'found'],
      ['with a note longer than a note', { note: 'x'.repeat(501) }, 'note'],
      ['of a day to come', { visit: visit({ visitedOn: '2026-05-21' }) }, 'visit.visitedOn'],
    ],
  },
  {
    kind: 'crust.record', targetKind: 'crust-reading', corrected: true,
    body: (counted) => ({ rowSampleId: counted.row('A-1'), visit: visit(), sproutsSound: 6, sproutsDead: 1, crust: 'thick', replacesId: null }),
    changed: { sproutsSound: 7 },
    bad: [
      ['of half a sprout', { sproutsSound: 1.5 }, 'sproutsSound'],
      ['below zero', { sproutsDead: -1 }, 'sproutsDead'],
      ['of more than any row holds', { sproutsSound: 2_001 }, 'sproutsSound'],
      ['of no thickness', { crust: null }, 'crust'],
    ],
  },
  {
    kind: 'transect.record', targetKind: 'field-transect', corrected: true,
    body: (counted) => ({ plantingId: counted.plantingId, stripId: null, readOn: '2026-05-09', marksRead: 100, marksCovered: 44, replacesId: null }),
    changed: { marksCovered: 45 },
    bad: [
      ['with more on residue than read', { marksCovered: 101 }, 'marksCovered'],
      ['with no marks', { marksRead: 0, marksCovered: 0 }, 'marksRead'],
      ['of a strip that is not there', { stripId: v7() }, 'stripId'],
      ['of a day to come', { readOn: '2026-05-21' }, 'readOn'],
      ['of another year', { readOn: '2024-05-09' }, 'readOn'],
    ],
  },
  {
    kind: 'condition.record', targetKind: 'condition', corrected: true,
    body: (counted) => ({
      plantingId: counted.plantingId, rowSampleId: counted.row('A-1'), observedOn: '2026-05-18', observedAt: '07:40', growthStage: 'V1',
      soilTemperature: { typed: '52.5', unit: 'F' }, soilMoisture: 'moist', replacesId: null,
    }),
    changed: { soilTemperature: { typed: '-1.5', unit: 'C' } },
    bad: [
      ['of nothing', { growthStage: null, soilTemperature: null, soilMoisture: null }, 'growthStage'],
      ['at a stage of no list', { growthStage: 'V11' }, 'growthStage'],
      ['hotter than soil', { soilTemperature: { typed: '151', unit: 'F' } }, 'soilTemperature.typed'],
      ['colder than soil', { soilTemperature: { typed: '-19', unit: 'C' } }, 'soilTemperature.typed'],
      ['in letters', { soilTemperature: { typed: 'cold', unit: 'F' } }, 'soilTemperature.typed'],
      ['at a row that is not there', { rowSampleId: v7() }, 'rowSampleId'],
      ['at no time of day', { observedAt: '25:00' }, 'observedAt'],
      ['of a day to come', { observedOn: '2026-05-21' }, 'observedOn'],
    ],
  },
  {
    kind: 'note.record', targetKind: 'note', corrected: false,
    body: (counted) => ({ plantingId: counted.plantingId, rowSampleId: null, notedOn: '2026-05-18', notedAt: null, text: 'Wheel tracks come up later' }),
    changed: { text: 'Wheel tracks come up no later' },
    bad: [
      ['without a word', { text: '  ' }, 'text'],
      ['longer than a note', { text: 'x'.repeat(1_001) }, 'text'],
      ['of a day to come', { notedOn: '2026-05-21' }, 'notedOn'],
      ['at a row that is not there', { rowSampleId: v7() }, 'rowSampleId'],
    ],
  },
  {
    kind: 'markers.record', targetKind: 'marker-tally', corrected: true,
    body: (counted) => ({ rowSampleId: counted.row('A-1'), happenedOn: '2026-05-18', event: 'set', markers: 24, replacesId: null }),
    changed: { markers: 25 },
    bad: [
      ['below zero', { markers: -1 }, 'markers'],
      ['of more than any row holds', { markers: 2_001 }, 'markers'],
      ['lost', { event: 'lost' }, 'event'],
      ['of a day to come', { happenedOn: '2026-05-21' }, 'happenedOn'],
    ],
  },
  {
    kind: 'entry-restriction.record', targetKind: 'entry-restriction', corrected: true,
    body: (counted) => ({ fieldId: sprayed(counted), product: 'A burndown', endedOn: '2026-05-17', endedAt: '14:30', hours: 48, replacesId: null }),
    changed: { hours: 24.5 },
    bad: [
      ['of no product', { product: ' ' }, 'product'],
      ['of no hours', { hours: 0 }, 'hours'],
      ['of more hours than a label says', { hours: 2_001 }, 'hours'],
      ['at no time of day', { endedAt: '' }, 'endedAt'],
      ['of a day to come', { endedOn: '2026-05-21' }, 'endedOn'],
    ],
  },
];

/** What stands in the planting and on its farm, by the name a withdrawal knows it by. */
export async function standingOf(counted: CountScene): Promise<Record<string, readonly Sent[]>> {
  const { db, organisationId } = counted.scene;
  return inOrganisation(db, { organisationId }, async (tx) => {
    const { depthReadings, digs, crustReadings, markerTallies, transects, conditions, notes } = await readFieldRecords(tx, { organisationId, plantingId: counted.plantingId });
    const restrictions = (await readRestrictions(tx, { organisationId })).filter(({ fieldId }) => fieldId === sprayed(counted));
    return {
      'depth-reading': depthReadings, dig: digs, 'crust-reading': crustReadings, 'marker-tally': markerTallies,
      'field-transect': transects, condition: conditions, note: notes, 'entry-restriction': restrictions,
    };
  });
}
