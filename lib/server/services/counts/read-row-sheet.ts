import 'server-only';
import { can } from '@/lib/access/can';
import { AppError } from '@/lib/errors/app-error';
import { listMemberNames } from '../../data/member-name';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { rowSampleFacts } from './count-facts';
import { readObservations } from './read-observations';
import { rowFindings } from './row-findings';
import { readPlacedRows } from './row-places';

/** One row sample with all that stands of it, to be read and added to. */
export async function readRowSheet(context: ReadContext, plantingId: string, rowSampleId: string) {
  const { tx, actor, clock } = context;
  const { organisationId } = actor;
  const { planting, farm } = await findSeenPlanting(context, plantingId);
  const placed = await readPlacedRows(context, plantingId);
  const index = placed.findIndex(({ sample }) => sample.id === rowSampleId);
  const here = placed[index];
  if (!here) throw new AppError('not-found');
  const all = await readObservations(tx, { organisationId, plantingId });
  const ofRow = <Each extends { rowSampleId: string }>(rows: readonly Each[]) => rows.filter((each) => each.rowSampleId === rowSampleId);
  const counts = ofRow(all.counts);
  const tapeSheets = ofRow(all.tapeSheets);
  const { lengthInches, seeds } = rowSampleFacts(planting, here.sample);
  const neighbor = (at: number) => (placed[at] ? { id: placed[at].sample.id, label: placed[at].sample.label } : null);
  const today = clock.today(farm.timeZone);
  const mayWrite = can(actor, 'observations.write');
  return {
    plantingId,
    plantedOn: planting.plantedOn,
    today,
    row: {
      id: rowSampleId,
      label: here.sample.label,
      place: here.place,
      length: { typed: here.sample.lengthTyped, unit: here.sample.lengthUnit },
      lengthInches,
      startEnd: here.sample.startEnd,
      farEnd: here.sample.farEnd,
      seeds,
    },
    counts: counts.map(({ id, visitId, visitedOn, visitedAt, marker, personId, personName, countedAs, plants, plantsUp, doubtful, originKind, used, alsoCountedBy }) => ({
      id, visitId, visitedOn, visitedAt, marker, personId, personName, countedAs, plants, plantsUp, doubtful, originKind, used, alsoCountedBy,
    })),
    tapeSheets: tapeSheets.map(({ id, visitId, visitedOn, visitedAt, visitMarker, personId, personName, tapeUnit, laid, used, places }) => ({
      id, visitId, visitedOn, visitedAt, visitMarker, personId, personName, tapeUnit, laid, used, places,
    })),
    residueReadings: ofRow(all.residueReadings).map(({ id, readOn, marksRead, marksCovered }) => ({ id, readOn, marksRead, marksCovered })),
    findings: rowFindings({ on: planting.plantedOn, at: planting.plantedAt }, counts, tapeSheets.find((sheet) => sheet.used), today),
    people: mayWrite ? await listMemberNames(tx, { organisationId }) : [],
    me: actor.personId,
    previous: neighbor(index - 1),
    next: neighbor(index + 1),
    mayWrite,
  };
}
export type RowSheet = Awaited<ReturnType<typeof readRowSheet>>;
