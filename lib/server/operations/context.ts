import 'server-only';
import type { Transaction } from '@/db/connection';
import type { Actor } from '@/lib/access/can';
import type { OperationEnvelope } from '@/lib/schemas/operation';
import type { OriginKind } from '@/lib/schemas/vocabulary';
import type { Clock } from '../clock';

/** What every read service is given: who asks, inside which transaction, and what day it is. */
export type ReadContext = { tx: Transaction; actor: Actor; clock: Clock; organisation: { name: string; timeZone: string; demoToday: string | null } };

/** What every write service is given besides. */
export type WriteContext = ReadContext & { operation: OperationEnvelope; originKind: OriginKind };

/** What a write service answers: the version the thing now has, and what else the sender must know. */
export type Written = { version?: number; result?: Record<string, unknown> };
