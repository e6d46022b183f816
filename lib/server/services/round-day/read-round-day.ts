import 'server-only';
import { Temporal } from 'temporal-polyfill';
import { seesFarm } from '@/lib/access/can';
import { readingIn } from '@/lib/schemas/reading';
import { roundDayMark, roundDayVersion, type RoundDay, type RoundPlanting, type RoundRestriction } from '@/lib/schemas/round-day';
import { listFarms } from '../../data/farm';
import { listFields } from '../../data/field';
import { listPlantings, type PlantingRow } from '../../data/planting';
import { listStrips } from '../../data/strip';
import { findTrialOfPlanting } from '../../data/trial';
import type { ReadContext } from '../../operations/context';
import { rowSampleFacts } from '../counts/count-facts';
import { readObservations } from '../counts/read-observations';
import { readPlacedRows } from '../counts/row-places';
import { readRestrictions, type FieldRestriction } from '../entry-restrictions/read-restrictions';
import { readFieldRecords } from '../field-records/read-field-records';
import { roundPlantingRecords } from './round-records';
import { roundRow } from './round-row';

/** A stand is counted within weeks; what was planted longer ago than this nobody walks to any more. */
const seasonDays = 200;

/**
 * What a phone takes along: the places this person sees, and what was seen there before. No setting is read here at
 * all, neither planned nor planted, so that none can reach a phone.
 */
export async function readRoundDay(context: ReadContext): Promise<RoundDay> {
  const { tx, actor, clock, organisation } = context;
  const { organisationId } = actor;
  const farms = (await listFarms(tx, { organisationId })).filter((farm) => seesFarm(actor, farm.id));
  const fields = (await listFields(tx, { organisationId })).filter((field) => farms.some((farm) => farm.id === field.farmId));
  const today = Temporal.PlainDate.from(clock.today(organisation.timeZone));
  const plantings = (await listPlantings(tx, { organisationId })).filter(
    (planting) => fields.some((field) => field.id === planting.fieldId) && Temporal.PlainDate.from(planting.plantedOn).until(today).days <= seasonDays,
  );
  const restrictions = (await readRestrictions(tx, { organisationId })).filter((each) => Temporal.PlainDate.from(each.endedOn).until(today).days <= seasonDays);
  const taken: RoundPlanting[] = [];
  for (const planting of plantings) taken.push(await roundPlanting(context, planting));
  return {
    what: roundDayMark,
    version: roundDayVersion,
    organisation: { id: organisationId, ...organisation },
    person: { id: actor.personId, name: actor.name, role: actor.role },
    readAt: clock.now().toISOString(),
    farms: farms.map(({ id, name, timeZone }) => ({ id, name, timeZone })),
    fields: fields.map(({ id, farmId, name }) => ({ id, farmId, name, restrictions: restrictions.filter(({ fieldId }) => fieldId === id).map(roundRestriction) })),
    plantings: taken,
  };
}

function roundRestriction({ id, product, endedOn, endedAt, hours, personName, exceptions }: FieldRestriction): RoundRestriction {
  return {
    id, product, endedOn, endedAt, hours, personName,
    exceptions: exceptions.map(({ id: exceptionId, personId, enteredOn, exception, equipment }) => ({ id: exceptionId, personId, enteredOn, exception, equipment })),
  };
}

async function roundPlanting(context: ReadContext, planting: PlantingRow): Promise<RoundPlanting> {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const params = { organisationId, plantingId: planting.id };
  const trial = await findTrialOfPlanting(tx, params);
  const strips = trial ? await listStrips(tx, { organisationId, trialId: trial.id }) : [];
  const placed = await readPlacedRows(context, planting.id);
  const observed = await readObservations(tx, params);
  const records = await readFieldRecords(tx, params);
  return {
    id: planting.id,
    fieldId: planting.fieldId,
    plantedOn: planting.plantedOn,
    plantedAt: planting.plantedAt,
    crop: planting.crop,
    rowSpacingInches: readingIn({ unit: planting.rowSpacingUnit, thousandths: planting.rowSpacingThousandths }, 'in'),
    seedsPerAcre: readingIn({ unit: planting.seedingRateUnit, thousandths: planting.seedingRateThousandths }, 'per-acre'),
    hasTrial: trial !== undefined,
    strips: strips.map(({ id, number, blockNumber, asPlanted }) => ({ id, number, blockNumber, lost: asPlanted !== null && asPlanted.settingId === null })),
    ...roundPlantingRecords(records),
    rows: placed.map((each) => roundRow(each, rowSampleFacts(planting, each.sample), observed, records)),
  };
}
