import 'server-only';
import type { Transaction } from '@/db/connection';
import { AppError, badField } from '@/lib/errors/app-error';
import { listWithdrawnAmong } from '../../data/withdrawal';
import type { WriteContext, Written } from '../../operations/context';
import { originColumns } from '../../operations/origin-columns';

type ById = (tx: Transaction, params: { organisationId: string; id: string }) => Promise<unknown>;
type Row<Find extends ById> = NonNullable<Awaited<ReturnType<Find>>>;

/** What differs between the nouns that are appended, beside their columns. */
export type RecordKind<Find extends ById> = {
  find: Find;
  /** Null for a noun that is taken back and written anew instead of corrected. */
  corrections: {
    replacesId: string | null;
    list: (tx: Transaction, params: { organisationId: string; id: string }) => Promise<Row<Find>[]>;
    /** Whether a recorded one belongs to the same place, and may be corrected from there. */
    isHere: (row: Row<Find>) => boolean;
    /** What a sender whose correction lost is shown of the one that stands. */
    shown: (row: Row<Find>) => Record<string, unknown>;
    noSuch: string;
  } | null;
  /** Whether a recorded one holds the very content that was sent. */
  isSame: (row: Row<Find>) => boolean;
  /** What is asked about and made before the row itself, such as its visit; not called for one that stands already. */
  before?: () => Promise<void>;
  insert: (columns: { id: string } & ReturnType<typeof originColumns>) => Promise<boolean>;
};

/**
 * Appends one record under the id the sender gave it. Sent again under another operation, as when the answer got lost, it
 * is answered as before; other content under its id is refused. A correction names a record that stands: one that was
 * corrected or taken back meanwhile has lost, and the answer shows what stands now. The caller holds the row sample,
 * planting or field, so that of two corrections at once one comes second.
 */
export async function keepRecord<Find extends ById>(context: WriteContext, kind: RecordKind<Find>): Promise<Written> {
  const { tx, actor, operation } = context;
  const twin = (await kind.find(tx, { organisationId: actor.organisationId, id: operation.thingId })) as Row<Find> | undefined;
  if (twin) {
    if (!kind.isSame(twin)) throw new AppError('operation-reused');
    return { version: 1 };
  }
  await assertCorrectable(context, kind);
  await kind.before?.();
  if (!(await kind.insert({ id: operation.thingId, ...originColumns(context) }))) throw new AppError('operation-reused');
  return { version: 1 };
}

async function assertCorrectable<Find extends ById>({ tx, actor }: WriteContext, { find, corrections }: RecordKind<Find>): Promise<void> {
  if (!corrections || corrections.replacesId === null) return;
  const { organisationId } = actor;
  const target = (await find(tx, { organisationId, id: corrections.replacesId })) as Row<Find> | undefined;
  if (!target || !corrections.isHere(target)) throw badField('replacesId', corrections.noSuch);
  let standing = target;
  let standingId = corrections.replacesId;
  for (;;) {
    const later = (await corrections.list(tx, { organisationId, id: standingId })) as (Row<Find> & { id: string })[];
    const withdrawn = await listWithdrawnAmong(tx, { organisationId, ids: later.map((row) => row.id) });
    const next = later.findLast((row) => !withdrawn.has(row.id));
    if (!next) break;
    standing = next;
    standingId = next.id;
  }
  if (standingId !== corrections.replacesId) throw new AppError('conflict', { standing: corrections.shown(standing) });
  if ((await listWithdrawnAmong(tx, { organisationId, ids: [standingId] })).has(standingId)) {
    throw new AppError('conflict', { sentence: 'Somebody took this back since you opened it. Your version is kept; record it anew if it holds.' });
  }
}
