import 'server-only';
import { listAuditEvents } from '../../data/audit-event';
import { listLosingEdits } from '../../data/losing-edit';
import type { ReadContext } from '../../operations/context';
import { findBrokenSeal } from './seal-audit';

const changesAPage = 100;

/** Who changed what, newest first, the edits that lost against another, and whether the sealed chain is whole. */
export async function readChanges({ tx, actor }: ReadContext, { before }: { before: string | null }) {
  const { organisationId } = actor;
  const events = await listAuditEvents(tx, { organisationId, most: changesAPage + 1, before });
  const losing = before === null ? await listLosingEdits(tx, { organisationId, most: changesAPage }) : [];
  const shown = events.slice(0, changesAPage);
  return {
    brokenAt: (await findBrokenSeal(tx, organisationId)) ?? null,
    changes: shown.map(({ id, kind, body, deviceId, recordedAt, personName, readInByName }) => ({ id, kind, body, deviceId, recordedAt, personName, readInByName })),
    older: events.length > changesAPage ? (shown.at(-1)?.recordedAt ?? null) : null,
    losingEdits: losing.map(({ operationId, kind, body, receivedAt, personName }) => ({ operationId, kind, body, receivedAt, personName })),
  };
}
export type Changes = Awaited<ReturnType<typeof readChanges>>;
