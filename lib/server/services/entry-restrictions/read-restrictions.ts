import 'server-only';
import type { Transaction } from '@/db/connection';
import type { RoundRestriction } from '@/lib/schemas/round-day';
import { listEntryExceptions } from '../../data/entry-exception';
import { listEntryRestrictions, type EntryRestrictionRow } from '../../data/entry-restriction';
import { listWithdrawnIds } from '../../data/withdrawal';
import { standingRecords } from '../field-records/standing-records';

export type FieldRestriction = Omit<RoundRestriction, 'exceptions'> & {
  fieldId: string;
  timeZone: string;
  exceptions: (RoundRestriction['exceptions'][number] & { personName: string })[];
};

/**
 * The newest word on each application in the fields of an organisation, with the exceptions recorded under it. One recorded
 * before the interval was corrected stays with the application it was made for.
 */
export async function readRestrictions(tx: Transaction, params: { organisationId: string }): Promise<FieldRestriction[]> {
  const withdrawn = await listWithdrawnIds(tx, params);
  const recorded = await listEntryRestrictions(tx, params);
  const exceptions = standingRecords(await listEntryExceptions(tx, params), withdrawn);
  return standingRecords(recorded, withdrawn).map((row) => {
    const versions = versionsOf(row, recorded);
    const { id, fieldId, product, endedOn, endedAt, timeZone, hours, personName } = row;
    return {
      id, fieldId, product, endedOn, endedAt, timeZone, hours, personName,
      exceptions: exceptions
        .filter((each) => versions.has(each.restrictionId))
        .map((each) => ({ id: each.id, personId: each.personId, personName: each.personName, enteredOn: each.enteredOn, exception: each.exception, equipment: each.equipment })),
    };
  });
}

/** The row and all that it corrected, one before the other. */
function versionsOf(row: EntryRestrictionRow, recorded: readonly EntryRestrictionRow[]): Set<string> {
  const versions = new Set<string>();
  for (let each: EntryRestrictionRow | undefined = row; each; each = recorded.find(({ id }) => id === each?.replacesId)) versions.add(each.id);
  return versions;
}
