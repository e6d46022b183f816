import 'server-only';
import type { Transaction } from '@/db/connection';
import { organisation } from '@/db/schema/organisation';

export async function insertOrganisation(tx: Transaction, values: { id: string; name: string; timeZone: string }) {
  await tx.insert(organisation).values(values);
}
