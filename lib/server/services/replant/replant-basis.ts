import 'server-only';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { rowStand } from '@/lib/agronomy/row-stand';
import { register } from '@/lib/agronomy/register';
import { inferenceRegister } from '@/lib/agronomy/register-inference';
import { readingIn } from '@/lib/schemas/reading';
import type { CountedRow, ReplantBasis, ReplantGap, ReplantValue } from '@/lib/schemas/replant';
import { replantInputsSchema, type ReplantInputs } from '@/lib/schemas/replant-sheet';
import { readingOf } from '../../operations/reading-columns';
import type { ReplantSheetRow } from '../../data/replant-sheet';
import type { CoreSamples } from '../scores/core-samples';
import { momentOf } from '@/lib/schemas/resolve-counts';
import { replantSentences } from './replant-sentences';
import { fullYieldOf, isAfterPlanting, replantTerms } from './replant-terms';
import { replantValue } from './replant-value';
import { standOfScope, type ZoneOfField } from './stand-of-scope';

export type ReplantRecords = { core: CoreSamples; sheets: readonly ReplantSheetRow[] };

/** Everything one keep-or-replant answer rests on and says. Equal records give an equal basis, whoever asks and whenever. */
export function replantBasis(records: ReplantRecords, zoneId: string | null): ReplantBasis {
  const { core, sheets } = records;
  const zones = zonesOf(core);
  const zone = zones.find(({ id }) => id === zoneId) ?? null;
  const sheet = sheetOfScope(sheets, zoneId);
  const inputs = sheet ? replantInputsSchema.parse(sheet.inputs) : null;
  const scoped = samplesWithZone(core).filter((each) => zoneId === null || each.zoneId === zoneId);
  const {
    stand,
    gaps: standGaps,
    acres,
  } = standOfScope({ zone, zones, fieldAcres: fieldAcresOf(core), samples: samplesWithZone(core) });
  const fullYield = fullYieldOf(inputs, plannedFullYieldOf(core));
  const answer = answerOf(core.planting, stand, standGaps, inputs, fullYield, acres);
  const zoneAnswers =
    zoneId === null && answer.kind === 'value' ? zones.map((each) => zoneAnswer(records, each)) : [];
  return {
    plantingId: core.planting.id,
    fieldName: core.field.name,
    zone: zone && { id: zone.id, name: zone.name },
    crop: core.planting.crop,
    plantedOn: core.planting.plantedOn,
    acres,
    countedRows: scoped.map(({ sample }) => countedRow(core, zones, sample)),
    stand,
    sheet: sheet && inputs ? { id: sheet.id, ofWholeField: sheet.zoneId === null, inputs } : null,
    fullYield,
    answer,
    zoneAnswers,
    sentences:
      answer.kind === 'value'
        ? {
            us: replantSentences({ answer, acres, zoneAnswers }, 'us'),
            metric: replantSentences({ answer, acres, zoneAnswers }, 'metric'),
          }
        : null,
    versions: formulaVersions(),
  };
}

/** The newest figures typed for the zone; a zone without its own uses those of the whole field. */
export function sheetOfScope(
  sheets: readonly ReplantSheetRow[],
  zoneId: string | null,
): ReplantSheetRow | null {
  return (
    sheets.find((sheet) => sheet.zoneId === zoneId) ?? sheets.find((sheet) => sheet.zoneId === null) ?? null
  );
}

export function zonesOf(core: CoreSamples): ZoneOfField[] {
  const zones = core.zones.map(({ id, name, areaUnit, areaThousandths }) => ({
    id,
    name,
    acres: readingIn({ unit: areaUnit, thousandths: areaThousandths }, 'acres'),
  }));
  // In one order always, also where two carry one name: the basis is hashed as it stands.
  return zones.sort((a, b) => (`${a.name} ${a.id}` < `${b.name} ${b.id}` ? -1 : 1));
}

export function fieldAcresOf({ field }: CoreSamples): number | null {
  const area = readingOf(field.areaTyped, field.areaUnit, field.areaThousandths);
  return area && readingIn(area, 'acres');
}

export function plannedFullYieldOf({ planting }: CoreSamples): number | null {
  const planned = readingOf(planting.fullYieldTyped, planting.fullYieldUnit, planting.fullYieldThousandths);
  return planned && readingIn(planned, 'bu/ac');
}

/** A row sample whose zone was taken out of the plan lies in none. */
function samplesWithZone(core: CoreSamples) {
  const zoneIds = new Set(core.zones.map(({ id }) => id));
  const zoneByRow = new Map(
    core.rowSamples.map((row) => [
      row.id,
      row.zoneId !== null && zoneIds.has(row.zoneId) ? row.zoneId : null,
    ]),
  );
  return core.samples.map((sample) => ({ sample, zoneId: zoneByRow.get(sample.rowSampleId) ?? null }));
}

function answerOf(
  planting: CoreSamples['planting'],
  stand: ReplantBasis['stand'],
  standGaps: readonly ReplantGap[],
  inputs: ReplantInputs | null,
  fullYield: ReplantBasis['fullYield'],
  acres: number | null,
): ReplantBasis['answer'] {
  if (planting.crop !== 'corn')
    return { kind: 'insufficient', gaps: [{ reason: 'crop-without-table', names: [] }] };
  const gaps = [...standGaps];
  const terms = replantTerms(inputs, { plantedOn: planting.plantedOn, fullYield });
  if (terms.kind === 'missing') gaps.push({ reason: 'figures-missing', names: terms.figures });
  // The planting day may have been corrected after the sheet was saved.
  if (inputs?.replantOn && !isAfterPlanting(inputs.replantOn, planting.plantedOn))
    gaps.push({ reason: 'replant-not-after-planting', names: [] });
  if (gaps.length > 0 || terms.kind === 'missing' || !stand) return { kind: 'insufficient', gaps };
  return replantValue(terms.terms, stand, acres);
}

function zoneAnswer(records: ReplantRecords, zone: ZoneOfField): ReplantBasis['zoneAnswers'][number] {
  const { answer } = replantBasis(records, zone.id);
  const said: Pick<ReplantValue, 'recommendation' | 'gainDollarsPerAcre'> | null =
    answer.kind === 'value' ? answer : null;
  return {
    zoneId: zone.id,
    name: zone.name,
    acres: zone.acres,
    recommendation: said?.recommendation ?? null,
    gainDollarsPerAcre: said?.gainDollarsPerAcre ?? null,
  };
}

function countedRow(core: CoreSamples, zones: readonly ZoneOfField[], sample: RowSample): CountedRow {
  const row = core.rowSamples.find(({ id }) => id === sample.rowSampleId);
  const counts = core.observations.counts.filter(
    (each) => each.used && each.rowSampleId === sample.rowSampleId,
  );
  const last = counts.reduce<string>(
    (latest, each) => (momentOf(each) > latest ? momentOf(each) : latest),
    '',
  );
  const lastCounts = counts.filter((each) => momentOf(each) === last);
  const sheet = core.observations.tapeSheets.find(
    (each) => each.used && each.rowSampleId === sample.rowSampleId,
  );
  const stand = rowStand(sample);
  if (!row || stand.kind === 'insufficient') throw new Error('a row sample was taken as counted and is not');
  const { plantsPerAcre, plantsHeld, areaAcres, source } = stand.value;
  return {
    rowSampleId: row.id,
    label: row.label,
    zoneName: zones.find(({ id }) => id === row.zoneId)?.name ?? null,
    plantsPerAcre,
    plantsHeld,
    areaAcres,
    lastSeenOn: (source === 'counts' ? lastCounts[0]?.visitedOn : sheet?.visitedOn) ?? '',
    countIds: source === 'counts' ? lastCounts.map(({ id }) => id) : [],
    tapeSheetId: source === 'tape-sheet' ? (sheet?.id ?? null) : null,
  };
}

function formulaVersions(): Record<string, string> {
  const used = inferenceRegister.filter(({ id }) =>
    ['nafziger-1994', 'keep-or-replant', 'break-even-stand'].includes(id),
  );
  return Object.fromEntries(
    [register.plantsPerAcre, register.plantsPerAcreInterval, ...used].map(({ id, version }) => [id, version]),
  );
}
