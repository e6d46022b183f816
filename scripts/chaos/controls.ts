import type { Ledger } from './ledger';
import type { Plan } from './play';

export type Control = { name: string; breaks: string; change: Partial<Plan>; caughtBy: 'lost' | 'doubled' };

/** Without these keys the database no longer refuses what stands already. */
export const withoutKeys = ['receipt', 'audit_event', 'residue_reading', 'count', 'withdrawal'].map((table) => `alter table ${table} drop constraint ${table}_pk cascade`);

/** Each breaks one thing on purpose; the harness has to say so by the figure named, or its green means nothing. */
export const controls: readonly Control[] = [
  { name: 'no-unique-key', breaks: 'the unique keys of receipt, audit event and observations are dropped', change: { breakDatabase: withoutKeys }, caughtBy: 'doubled' },
  { name: 'receipt-first', breaks: 'the server commits the receipt before it makes the change', change: { broken: 'receipt-first' }, caughtBy: 'lost' },
  { name: 'check-then-insert', breaks: 'the server looks first and inserts afterwards, without unique keys', change: { broken: 'check-then-insert', breakDatabase: withoutKeys, habits: { twinShare: 0.3 } }, caughtBy: 'doubled' },
  { name: 'forgets-on-any-2xx', breaks: 'the phone forgets a batch on any 2xx, behind a captive portal', change: { portalShare: 0.3, habits: { forgetsOnAny2xx: true } }, caughtBy: 'lost' },
];

export const isCaught = (control: Control, ledger: Ledger) => ledger[control.caughtBy] > 0;
