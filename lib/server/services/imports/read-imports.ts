import 'server-only';
import { Temporal } from 'temporal-polyfill';
import { listImportFiles } from '../../data/import-file';
import { listRowSamples } from '../../data/row-sample';
import { listWithdrawnIds } from '../../data/withdrawal';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from '../plantings/find-seen-planting';

/** What the import page shows: the labels a file may name, and the files taken before. */
export async function readImports(context: ReadContext, plantingId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const { planting, farm } = await findSeenPlanting(context, plantingId);
  const samples = await listRowSamples(tx, { organisationId, plantingId });
  const files = await listImportFiles(tx, { organisationId, plantingId });
  const withdrawn = await listWithdrawnIds(tx, { organisationId });
  const planted = Temporal.PlainDate.from(planting.plantedOn);
  return {
    /** Days on which an example file may place its visits: plants are first looked for about then. */
    exampleDays: [planted.add({ days: 10 }).toString(), planted.add({ days: 11 }).toString()] as [string, string],
    timeZone: farm.timeZone,
    labels: samples.map((sample) => sample.label),
    files: files.map(({ id, kind, fileName, lines, records, createdAt, personName }) => ({
      id, kind, fileName, lines, records, createdAt, personName, takenBack: withdrawn.has(id),
    })),
  };
}
export type Imports = Awaited<ReturnType<typeof readImports>>;
