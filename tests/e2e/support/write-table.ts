import { insiders, type Insider, type Statuses } from './access-table';
import { things, type Things } from './demo-things';

type Sent = { thingId: string; body: Record<string, unknown> };

/**
 * The writes, reviewed by hand like the pages. Each body is sound up to the very last check of its service and refused
 * there (422 or 409), so that whoever is let through changes nothing: a change without the version it was made on, a visit
 * before planting, a hash that is not the page's.
 */
export type WriteRow = { kind: string; who: Record<Insider, Statuses>; sent: (things: Things, expected: number) => Sent };

const barred = [403, 403, 403, 403] as const;
const barredAnywhere = [403, '-', 403, 403] as const;
const everyFarm = [422, 422, 404, 404] as const;
const ownFarms = [422, 404, 404, 404] as const;
const anywhere = [422, '-', 404, 404] as const;

const row = (kind: string, statuses: readonly [Statuses, Statuses, Statuses, Statuses], sent: WriteRow['sent']): WriteRow => ({
  kind,
  who: Object.fromEntries(insiders.map((insider, index) => [insider, statuses[index]])) as WriteRow['who'],
  sent,
});

const planners = [barred, everyFarm, barred, everyFarm] as const;
const atRows = [ownFarms, everyFarm, barred, everyFarm] as const;
const adds = [[403, '-', '-', '-'], [422, '-', '-', '-'], [403, '-', '-', '-'], [422, '-', '-', '-']] as const;
const fresh = () => crypto.randomUUID();
const beforePlanting = () => ({ id: fresh(), personId: null, visitedOn: '2026-01-05', visitedAt: null, marker: null });
const noFarm = { name: 'Sent by a test', timeZone: 'America/Chicago' };
const planting = {
  plantedOn: '2026-05-07', plantedAt: null, crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '34,000' }, tagGermination: null,
  intendedStand: { typed: '31,500' }, fullYield: null, previousCrop: null, tillage: null, slowAfterDays: 2, lateAfterDays: 7, veryLateAfterDays: 14, zones: [],
};
const setting = {
  name: 'Sent by a test', phrase: 'the cleaners as a test has them', cleaner: 'none', wheels: null, pressureDirection: null, pressure: null, workingDepth: null,
  adjustedFrom: null, note: null,
};
const rowSample = { stripId: null, zoneId: null, label: 'T1', planterRow: null, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' };
const dig = () => ({
  pairId: fresh(), plant: 'late', where: 'twin-length', placeTyped: null, depth: null, residue: null, moisture: null, crust: null, found: ['sound'], note: null, replacesId: null,
});
const spotCount = () => ({
  field: { id: fresh(), name: 'Sent by a test' }, plantedOn: '2099-05-07', crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '34,000' }, intendedStand: { typed: '31,500' },
});
const replantInputs = {
  typedIn: 'us', fullYield: null, replantOn: '2026-01-05', replantStand: null, gapLossPercent: 0, unevenLossPercent: 0, poorSecondStandChancePercent: 0,
  poorSecondStandYieldPercent: null, pricePerBushel: null, costs: [], extraDryingPerAcre: null, insurancePaymentPerAcre: null,
};
const layout = () => ({
  plantingId: '', studyId: fresh(), studyName: 'Sent by a test', replacesTrialId: null, layout: 'pairs', mainFigure: 'score', comparisonRule: 'holm', settingIds: [fresh(), fresh()],
  referenceSettingId: fresh(), randomSeed: 1, blocks: [{ id: fresh(), strips: [{ id: fresh(), settingId: fresh() }, { id: fresh(), settingId: fresh() }] }],
});

// prettier-ignore
export const writesOfOrganisation: Record<string, readonly WriteRow[]> = {
  'POST /api/o/[org]/farms': [
    row('farm.add', adds, () => ({ thingId: fresh(), body: { ...noFarm, name: '' } })),
    row('farm.change', planners, (it) => ({ thingId: it.farm, body: noFarm })),
    row('farm.remove', planners, (it) => ({ thingId: it.farm, body: {} })),
  ],
  'POST /api/o/[org]/fields': [
    row('field.add', planners, (it, expected) => ({ thingId: fresh(), body: { farmId: it.farm, name: expected === 404 ? noFarm.name : '', area: null } })),
    row('field.change', planners, (it) => ({ thingId: it.field, body: { name: 'Sent by a test', area: null } })),
    row('field.remove', planners, (it) => ({ thingId: it.field, body: {} })),
  ],
  'POST /api/o/[org]/settings': [
    row('setting.add', adds, () => ({ thingId: fresh(), body: { ...setting, name: '' } })),
    row('setting.change', [barredAnywhere, anywhere, barredAnywhere, anywhere], (it) => ({ thingId: it.setting, body: setting })),
    row('setting.remove', [barredAnywhere, anywhere, barredAnywhere, anywhere], (it) => ({ thingId: it.setting, body: {} })),
  ],
  'POST /api/o/[org]/plantings': [
    row('planting.add', planners, (it) => ({ thingId: fresh(), body: { ...planting, fieldId: it.field, plantedOn: '2099-05-07' } })),
    row('planting.change', planners, (it) => ({ thingId: it.planting, body: planting })),
    row('planting.remove', planners, (it) => ({ thingId: it.planting, body: {} })),
  ],
  'POST /api/o/[org]/trials': [
    // The trial of the own farm is locked; the planting of the other farm has none and knows no such settings.
    row('trial.lay-out', [barred, [409, 422, 404, 404], barred, [409, 422, 404, 404]], (it) => ({ thingId: fresh(), body: { ...layout(), plantingId: it.planting } })),
    row('trial.lock', [barredAnywhere, [409, '-', 404, 404], barredAnywhere, [409, '-', 404, 404]], (it) => ({ thingId: it.trial, body: {} })),
    row('trial.as-planted', [barredAnywhere, anywhere, barredAnywhere, anywhere], (it) => ({ thingId: it.trial, body: { strips: [{ id: fresh(), stripId: fresh(), settingId: null, reason: 'Sent by a test' }] } })),
  ],
  'POST /api/o/[org]/row-samples': [
    row('row-samples.add', planners, (it) => ({ thingId: it.planting, body: { plantingId: it.planting, samples: [{ ...rowSample, id: fresh(), zoneId: fresh() }] } })),
    row('row-sample.change', planners, (it) => ({ thingId: it.rowSample, body: rowSample })),
    row('row-sample.remove', planners, (it) => ({ thingId: it.rowSample, body: {} })),
  ],
  'POST /api/o/[org]/counts': [
    row('count.record', [ownFarms, everyFarm, barred, everyFarm], (it) => ({ thingId: fresh(), body: { rowSampleId: it.rowSample, visit: beforePlanting(), countedAs: 'so-far', plants: 20, doubtful: 0, replacesId: null } })),
  ],
  'POST /api/o/[org]/tape-sheets': [
    row('tape-sheet.record', [ownFarms, everyFarm, barred, everyFarm], (it) => ({ thingId: fresh(), body: { rowSampleId: it.rowSample, visit: beforePlanting(), tapeUnit: 'in', places: [{ typed: '6', kind: 'plant', marker: null, leafStage: null }], replacesId: null } })),
  ],
  'POST /api/o/[org]/residue-readings': [
    row('residue.record', [ownFarms, everyFarm, barred, everyFarm], (it) => ({ thingId: fresh(), body: { rowSampleId: it.rowSample, readOn: '2020-01-05', marksRead: 50, marksCovered: 10 } })),
  ],
  'POST /api/o/[org]/depth-readings': [
    row('depth.record', atRows, (it) => ({ thingId: fresh(), body: { rowSampleId: it.rowSample, visit: beforePlanting(), unit: 'in', depths: ['2'], replacesId: null } })),
  ],
  'POST /api/o/[org]/digs': [
    row('dig.record', atRows, (it) => ({ thingId: fresh(), body: { ...dig(), rowSampleId: it.rowSample, visit: beforePlanting() } })),
  ],
  'POST /api/o/[org]/crust-readings': [
    row('crust.record', atRows, (it) => ({ thingId: fresh(), body: { rowSampleId: it.rowSample, visit: beforePlanting(), sproutsSound: 6, sproutsDead: 1, crust: 'thick', replacesId: null } })),
  ],
  'POST /api/o/[org]/field-transects': [
    row('transect.record', atRows, (it) => ({ thingId: fresh(), body: { plantingId: it.planting, stripId: null, readOn: '2020-01-05', marksRead: 100, marksCovered: 44, replacesId: null } })),
  ],
  'POST /api/o/[org]/conditions': [
    row('condition.record', atRows, (it) => ({ thingId: fresh(), body: { plantingId: it.planting, rowSampleId: null, observedOn: '2020-01-05', observedAt: null, growthStage: 'V1', soilTemperature: null, soilMoisture: null, replacesId: null } })),
  ],
  'POST /api/o/[org]/photos': [
    row('photo.record', atRows, (it) => ({ thingId: fresh(), body: { plantingId: it.planting, rowSampleId: null, digId: null, takenOn: '2020-01-05', takenAt: null, place: null, sha256: '0'.repeat(64), bytes: 1 } })),
  ],
  'POST /api/o/[org]/notes': [
    row('note.record', atRows, (it) => ({ thingId: fresh(), body: { plantingId: it.planting, rowSampleId: null, notedOn: '2020-01-05', notedAt: null, text: 'Sent by a test' } })),
  ],
  'POST /api/o/[org]/marker-tallies': [
    row('markers.record', atRows, (it) => ({ thingId: fresh(), body: { rowSampleId: it.rowSample, happenedOn: '2020-01-05', event: 'set', markers: 20, replacesId: null } })),
  ],
  'POST /api/o/[org]/entry-restrictions': [
    row('entry-restriction.record', atRows, (it) => ({ thingId: fresh(), body: { fieldId: it.field, product: 'Sent by a test', endedOn: '2020-01-05', endedAt: '12:00', hours: 24, replacesId: null } })),
    // Nobody has sprayed a field of the demo, so there is none to enter early.
    row('entry-exception.record', [[404, 404, 404, 404], [404, 404, 404, 404], barred, [404, 404, 404, 404]], () => ({ thingId: fresh(), body: { restrictionId: fresh(), enteredOn: '2026-05-18', exception: 'Sent by a test', equipment: 'Sent by a test' } })),
  ],
  'POST /api/o/[org]/spot-counts': [
    row('spot-count.start', atRows, (it) => ({ thingId: fresh(), body: { ...spotCount(), farmId: it.farm } })),
    row('spot-place.add', atRows, (it) => ({ thingId: fresh(), body: { plantingId: it.planting, zoneId: fresh(), label: 'T1', length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' } })),
  ],
  'POST /api/o/[org]/withdrawals': [
    // Only what must not be found is sent whole: an own count would be taken back.
    row('observation.withdraw', [ownFarms, everyFarm, barred, everyFarm], (it, expected) => ({ thingId: fresh(), body: { targetKind: 'count', targetId: it.count, reason: expected === 404 ? 'Sent by a test' : '' } })),
  ],
  'POST /api/o/[org]/imports': [
    row('import.take', [ownFarms, everyFarm, barred, everyFarm], (it) => ({ thingId: fresh(), body: { plantingId: it.planting, importKind: 'counts', fileName: 'sent-by-a-test.csv', text: 'nothing,of,ours\n1,2,3' } })),
  ],
  'POST /api/o/[org]/replant-sheets': [
    row('replant-sheet.save', [barred, everyFarm, ownFarms, everyFarm], (it) => ({ thingId: fresh(), body: { plantingId: it.planting, zoneId: null, inputs: replantInputs } })),
  ],
  'POST /api/o/[org]/decisions': [
    row('decision.sign', [barred, barred, [409, 404, 404, 404], [409, 409, 404, 404]], (it) => ({ thingId: fresh(), body: { plantingId: it.planting, zoneId: null, decided: 'keep', signedName: 'A test', basisHash: '0'.repeat(64) } })),
  ],
  'POST /api/o/[org]/people': [
    row('person.invite', [barredAnywhere, barredAnywhere, barredAnywhere, [422, '-', 422, 422]], (it) => ({ thingId: fresh(), body: { email: 'nobody@quillfern.example', name: it === things.own ? '' : 'Sent by a test', role: 'scout', farmIds: [it.farm] } })),
    row('person.change-role', [barredAnywhere, barredAnywhere, barredAnywhere, anywhere], (it) => ({ thingId: it.person, body: { role: 'owner', farmIds: [] } })),
    row('person.remove', [barredAnywhere, barredAnywhere, barredAnywhere, anywhere], (it) => ({ thingId: it.person, body: {} })),
    row('person.reset-link', [barredAnywhere, barredAnywhere, barredAnywhere, [422, '-', 404, 404]], (it, expected) => ({ thingId: expected === 422 ? 'no id' : it.person, body: {} })),
    row('link.revoke', [barredAnywhere, barredAnywhere, barredAnywhere, [404, '-', 404, 404]], () => ({ thingId: fresh(), body: {} })),
  ],
};

/** The batch takes any kind and answers each for itself; a batch of nothing is refused to whoever is let in. */
export const batchRoute = 'POST /api/o/[org]/operations';
