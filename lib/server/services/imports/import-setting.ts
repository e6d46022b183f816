import 'server-only';
import type { FieldProblem } from '@/lib/errors/app-error';
import type { ImportProblem } from '@/lib/schemas/import-table';
import type { PlantingRow } from '../../data/planting';
import { listRowSamples, lockRowSamples, type RowSampleRow } from '../../data/row-sample';
import type { WriteContext } from '../../operations/context';
import type { VisitFacts } from '../counts/check-visit';
import { readObservations, type Observations } from '../counts/read-observations';
import { visitFacts } from '../counts/visit-facts';

/** What the lines of a file are read against: the planting's row samples by label, and all that stands. */
export type ImportSetting = {
  planting: PlantingRow;
  timeZone: string;
  visits: VisitFacts;
  rowSampleOf: (label: string) => RowSampleRow | undefined;
  observations: Observations;
};

export async function readImportSetting(context: WriteContext, planting: PlantingRow, timeZone: string): Promise<ImportSetting> {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const samples = await listRowSamples(tx, { organisationId, plantingId: planting.id });
  await lockRowSamples(tx, { organisationId, rowSampleIds: samples.map((sample) => sample.id) });
  const byLabel = new Map(samples.map((sample) => [sample.label.toLowerCase(), sample]));
  return {
    planting,
    timeZone,
    visits: visitFacts(context, planting, timeZone),
    rowSampleOf: (label) => byLabel.get(label.toLowerCase()),
    observations: await readObservations(tx, { organisationId, plantingId: planting.id }),
  };
}

export const unknownRowSample = (line: number, label: string): ImportProblem => ({
  line,
  column: 'row_sample',
  message: `There is no row sample "${label}" in this planting. Write it as on its peg.`,
});

/** A problem of a file as the wire carries it: the line and column in its sentence, and as its path. */
export function importField({ line, column, message }: ImportProblem): FieldProblem {
  const place = [line === null ? null : `Line ${line}`, column].filter(Boolean).join(', ');
  return { path: ['text', line, column].filter((part) => part !== null).join('.'), message: place ? `${place}: ${message}` : message };
}
