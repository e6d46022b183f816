import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { dayAfter } from './day-after';
import { demoId } from './demo-id';
import { cropService } from './demo-people';
import type { DemoWriter } from './demo-writer';
import { personIdOf } from './insert-account';
import { inParallel } from './in-parallel';
import { observeCounts, observeTape, type CountedVisit, type ReadPlace } from './observe-row';
import { trialPlantingId } from './trial-ids';
import type { LaidBlock, LaidRow } from './trial-layout';
import { trialPlan } from './trial-truth';

type ObservedRow = { row: LaidRow; stripNumber: number; scout: string; visits: CountedVisit[]; places: ReadPlace[] };

const writesAtOnce = 6;

/** The strip whose counts were typed at the field's edge; the paper of all others was brought in as files at the end. */
const typedStripNumber = 1;

/**
 * What the two scouts found: cover the day after planting, a count of every row sample each day, and the tape sheets of the
 * last day. Each scout counts whole blocks, so that a difference between scouts lies between blocks and not between settings.
 */
export async function writeTrialCounts(write: DemoWriter, blocks: readonly LaidBlock[]): Promise<void> {
  const rows = blocks.flatMap((block) => block.strips.flatMap((strip) => strip.rows.map((row) => observed(row, strip.number, scoutOf(block.number)))));
  await inParallel(rows, writesAtOnce, (row) => writeCover(write, row));
  await inParallel(rows.filter((row) => row.stripNumber === typedStripNumber), writesAtOnce, (row) => writeTyped(write, row));
  const filed = rows.filter((row) => row.stripNumber !== typedStripNumber);
  for (const scout of new Set(filed.map((row) => row.scout))) {
    await writeFiles(write, scout, filed.filter((row) => row.scout === scout));
  }
}

const scoutOf = (blockNumber: number) => (blockNumber <= trialPlan.blocks / 2 ? 'scout-one' : 'scout-two');

function observed(row: LaidRow, stripNumber: number, scout: string): ObservedRow {
  const { firstVisitDay, lastVisitDay, rowLengthInches, seedsPerAcre, rowSpacingInches } = trialPlan;
  const visits = observeCounts(row.simulated.seeds, { first: firstVisitDay, last: lastVisitDay });
  const length = { lengthInches: rowLengthInches, theoreticalSpacingInches: theoreticalSpacingInches(seedsPerAcre, rowSpacingInches) };
  return { row, stripNumber, scout, visits, places: observeTape(row.simulated.seeds, visits, length) };
}

async function writeCover(write: DemoWriter, { row, scout }: ObservedRow): Promise<void> {
  const readOn = dayAfter(trialPlan.plantedOn, 1);
  const body = { rowSampleId: row.id, readOn, marksRead: trialPlan.coverMarks, marksCovered: row.simulated.coverMarks };
  await write({ kind: 'residue.record', thingId: demoId(`${row.id}/cover`), by: scout, on: readOn, body });
}

/** A length may begin and end with a seed and so hold one more than the rate says; places found empty count on the sheet as well. */
const seenSo = ['more-plants-than-seeds', 'more-places-than-seeds'];

async function writeTyped(write: DemoWriter, { row, scout, visits, places }: ObservedRow): Promise<void> {
  const visitOf = ({ day, marker }: CountedVisit) => ({
    id: demoId(`${row.id}/visit/${day}`), personId: personIdOf(cropService, scout), visitedOn: dayOf(day), visitedAt: null, marker,
  });
  for (const visit of visits) {
    const body = { rowSampleId: row.id, visit: visitOf(visit), countedAs: 'so-far', plants: visit.plantsUp, doubtful: 0, replacesId: null };
    await write({ kind: 'count.record', thingId: demoId(`${row.id}/count/${visit.day}`), by: scout, on: dayOf(visit.day), body, seenSo });
  }
  const last = visits.at(-1);
  if (!last) return;
  const body = { rowSampleId: row.id, visit: visitOf(last), tapeUnit: 'in', places, replacesId: null };
  await write({ kind: 'tape-sheet.record', thingId: demoId(`${row.id}/tape`), by: scout, on: dayOf(last.day), body, seenSo });
}

async function writeFiles(write: DemoWriter, scout: string, rows: readonly ObservedRow[]): Promise<void> {
  const on = dayOf(trialPlan.lastVisitDay);
  const counts = rows.flatMap(({ row, visits }) => visits.map(({ day, marker, plantsUp }) => [row.label, dayOf(day), plantsUp, marker]));
  const tapes = rows.flatMap(({ row, places }) => places.map(({ typed, kind, marker }) => [row.label, on, 'in', typed, kind, marker ?? '']));
  const take = (importKind: string, fileName: string, header: string, lines: readonly unknown[][]) =>
    write({
      kind: 'import.take',
      thingId: demoId(`${trialPlantingId}/${scout}/${importKind}`),
      by: scout,
      on,
      seenSo,
      body: { plantingId: trialPlantingId, importKind, fileName, text: [header, ...lines.map((line) => line.join(','))].join('\n') },
    });
  // The markers on the tape sheets tell a day only once the counts that set them stand.
  await take('counts', `${scout}-counts.csv`, 'row_sample,date,so_far,marker', counts);
  await take('tape-sheets', `${scout}-tape-sheets.csv`, 'row_sample,date,tape,place,kind,marker', tapes);
}

const dayOf = (day: number) => dayAfter(trialPlan.plantedOn, day);
