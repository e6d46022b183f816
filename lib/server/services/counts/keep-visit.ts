import 'server-only';
import { badField } from '@/lib/errors/app-error';
import type { VisitInput } from '@/lib/schemas/observation';
import { findMembership } from '../../data/membership';
import { findVisit, insertVisitOnce } from '../../data/visit';
import type { WriteContext } from '../../operations/context';
import { originColumns } from '../../operations/origin-columns';

/**
 * Makes the visit that an observation names, or takes the one that stands under its id. One that stands with another day,
 * time, marker or row is refused: what was typed would otherwise be swallowed.
 */
export async function keepVisit(context: WriteContext, rowSampleId: string, visit: VisitInput, timeZone: string): Promise<void> {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const { id, visitedOn, visitedAt, marker } = visit;
  const personId = visit.personId ?? actor.personId;
  if (personId !== actor.personId && !(await findMembership(tx, { organisationId, personId }))) {
    throw badField('visit.personId', 'This person does not belong to the account. Choose who was at the row.');
  }
  await insertVisitOnce(tx, { id, rowSampleId, personId, visitedOn, visitedAt, timeZone, marker, ...originColumns(context) });
  const standing = await findVisit(tx, { organisationId, visitId: id });
  if (standing?.rowSampleId !== rowSampleId) throw badField('visit.id', 'This visit belongs to another row sample. Open the sheet of that row.');
  if (standing.visitedOn !== visitedOn || standing.visitedAt !== visitedAt || standing.marker !== marker || standing.personId !== personId) {
    throw badField('visit.visitedOn', 'This visit stands already with another day, time, marker or person. Enter it as a visit of its own.');
  }
}
