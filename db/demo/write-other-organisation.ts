import { layout } from '@/lib/agronomy/layout';
import { demoId } from './demo-id';
import type { otherOrganisations } from './demo-people';
import type { DemoOperation, DemoWriter } from './demo-writer';
import { writeOtherFieldRecords } from './write-other-field-records';

type Other = (typeof otherOrganisations)[number];

/** The ids of what stands in an organisation that must not be seen, for whoever tries to reach it from outside. */
export const otherIdsOf = ({ key }: { key: string }) => {
  const of = (name: string) => demoId(`${key}/${name}`);
  return {
    farmId: of('farm'), fieldId: of('field'), plantingId: of('planting'), zoneId: of('zone'), settingIds: [of('setting-one'), of('setting-two')],
    studyId: of('study'), trialId: of('trial'), blockId: of('block'), stripIds: [of('strip-one'), of('strip-two')], rowSampleId: of('row'), visitId: of('visit'),
    countId: of('count'), wrongCountId: of('wrong-count'), tapeSheetId: of('tape'), residueId: of('residue'), withdrawalId: of('withdrawal'), importId: of('import'), replantSheetId: of('replant-sheet'), decisionId: of('decision'),
  };
};

const plantedOn = '2026-05-04';
const countedOn = '2026-05-20';

/**
 * A little of everything, with the organisation's own word in every text that a person writes: found anywhere else, it leaked.
 * `basisHashOf` reads what the decision is signed on, as the screen would show it.
 */
export async function writeOtherOrganisation(write: DemoWriter, other: Other, basisHashOf: (planting: string, zone: string) => Promise<string>): Promise<void> {
  const { word } = other;
  const ids = otherIdsOf(other);
  const send = (operation: Omit<DemoOperation, 'by' | 'on'> & { on?: string }) => write({ by: 'owner', on: '2026-05-01', ...operation });
  await send({ kind: 'farm.add', thingId: ids.farmId, body: { name: `${word} farm`, timeZone: other.timeZone } });
  await send({ kind: 'field.add', thingId: ids.fieldId, body: { farmId: ids.farmId, name: `${word} field`, area: { typed: '40' } } });
  for (const [index, thingId] of ids.settingIds.entries()) await send({ kind: 'setting.add', thingId, body: settingBody(word, index + 1) });
  await send({ kind: 'planting.add', thingId: ids.plantingId, body: plantingBody(word, ids) });
  await writeTrial(send, word, ids);
  await writeObservations(send, word, ids);
  await writeOtherFieldRecords(send, word, ids, countedOn);
  await send({ kind: 'replant-sheet.save', thingId: ids.replantSheetId, on: '2026-05-22', body: { plantingId: ids.plantingId, zoneId: ids.zoneId, inputs: replantInputs(word) } });
  const decision = { plantingId: ids.plantingId, zoneId: ids.zoneId, decided: 'keep', signedName: `${word} owner`, basisHash: await basisHashOf(ids.plantingId, ids.zoneId) };
  await send({ kind: 'decision.sign', thingId: ids.decisionId, on: '2026-05-23', body: decision });
}

type Send = (operation: Omit<DemoOperation, 'by' | 'on'> & { on?: string }) => Promise<void>;
type Ids = ReturnType<typeof otherIdsOf>;

function settingBody(word: string, number: number) {
  return {
    name: `${word} setting ${number}`, phrase: `the ${word} wheels ${number}`, cleaner: 'floating', wheels: 'smooth', pressureDirection: 'down',
    pressure: { typed: `${number}0 lbf` }, workingDepth: { typed: '1/2' }, adjustedFrom: 'wrench', note: `${word} note ${number}`,
  };
}

function plantingBody(word: string, ids: Ids) {
  return {
    fieldId: ids.fieldId, plantedOn, plantedAt: null, crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '33,000' }, tagGermination: { typed: '94' },
    intendedStand: { typed: '30,500' }, fullYield: { typed: '190' }, previousCrop: `${word} oats`, tillage: 'reduced', slowAfterDays: 2, lateAfterDays: 7,
    veryLateAfterDays: 14, zones: [{ id: ids.zoneId, name: `${word} corner`, area: { typed: '9' } }],
  };
}

/** One block of two strips, laid out in the order that the seed 2 draws of them. */
async function writeTrial(send: Send, word: string, ids: Ids): Promise<void> {
  const drawn = layout({ settings: ids.settingIds, blocks: 1, seed: 2 }).blocks[0]?.strips ?? [];
  const strips = drawn.map(({ setting }, index) => ({ id: ids.stripIds[index] ?? '', settingId: setting }));
  await send({
    kind: 'trial.lay-out',
    thingId: ids.trialId,
    body: {
      plantingId: ids.plantingId, studyId: ids.studyId, studyName: `${word} study`, layout: 'pairs', mainFigure: 'half-up-days', comparisonRule: 'holm',
      settingIds: ids.settingIds, referenceSettingId: ids.settingIds[0], randomSeed: 2, blocks: [{ id: ids.blockId, strips }],
    },
  });
  await send({ kind: 'trial.lock', thingId: ids.trialId, body: {}, baseVersion: 1 });
  const asPlanted = strips.map(({ id, settingId }, index) => ({ id: demoId(`${id}/as-planted`), stripId: id, settingId, reason: `${word} reason ${index + 1}` }));
  await send({ kind: 'trial.as-planted', thingId: ids.trialId, on: plantedOn, body: { strips: asPlanted } });
}

async function writeObservations(send: Send, word: string, ids: Ids): Promise<void> {
  const { plantingId, rowSampleId } = ids;
  const on = countedOn;
  const sample = { id: rowSampleId, stripId: ids.stripIds[0], zoneId: ids.zoneId, label: word, planterRow: 2, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' };
  await send({ kind: 'row-samples.add', thingId: plantingId, on, body: { plantingId, samples: [sample] } });
  const visit = { id: ids.visitId, personId: null, visitedOn: on, visitedAt: '08:00', marker: word };
  const count = { rowSampleId, visit, countedAs: 'so-far', plants: 29, doubtful: 1, replacesId: null };
  await send({ kind: 'count.record', thingId: ids.wrongCountId, on, body: { ...count, plants: 30 } });
  await send({ kind: 'observation.withdraw', thingId: ids.withdrawalId, on, body: { targetKind: 'count', targetId: ids.wrongCountId, reason: `${word} slip of the pen` } });
  await send({ kind: 'count.record', thingId: ids.countId, on, body: count });
  const places = ['7', '13 1/2', '20', '27'].map((typed) => ({ typed, kind: 'plant', marker: word, leafStage: 2 }));
  await send({ kind: 'tape-sheet.record', thingId: ids.tapeSheetId, on, body: { rowSampleId, visit, tapeUnit: 'in', places, replacesId: null } });
  await send({ kind: 'residue.record', thingId: ids.residueId, on, body: { rowSampleId, readOn: on, marksRead: 50, marksCovered: 21 } });
  const text = `row_sample,date,so_far,marker\n${word},2026-05-21,30,${word}`;
  await send({ kind: 'import.take', thingId: ids.importId, on: '2026-05-21', body: { plantingId, importKind: 'counts', fileName: `${word}.csv`, text } });
}

function replantInputs(word: string) {
  return {
    typedIn: 'us', fullYield: { typed: '190' }, pricePerBushel: '4', replantOn: '2026-06-01', replantStand: { typed: '30,000' },
    costs: [{ label: `${word} seed`, dollarsPerAcre: '30' }], extraDryingPerAcre: '8', insurancePaymentPerAcre: '0', gapLossPercent: 0,
    unevenLossPercent: 0, poorSecondStandChancePercent: 0, poorSecondStandYieldPercent: 80,
  };
}
