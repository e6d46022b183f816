import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import type { VisitInput } from '@/lib/schemas/observation';
import { lockRowSamples } from '../../data/row-sample';
import type { WriteContext } from '../../operations/context';
import { checkVisit } from '../counts/check-visit';
import { keepVisit } from '../counts/keep-visit';
import { visitFacts } from '../counts/visit-facts';
import { findSeenRowSample } from '../row-samples/find-seen-row-sample';

/** The row sample that a visit names, held until the transaction ends, with its day checked and the visit ready to be made. */
export async function holdVisitedRow(context: WriteContext, body: { rowSampleId: string; visit: VisitInput }) {
  const seen = await findSeenRowSample(context, body.rowSampleId);
  const { rowSample, planting, farm } = seen;
  const fields = checkVisit(body.visit, visitFacts(context, planting, farm.timeZone), 'visit.visitedOn');
  if (fields.length > 0) throw new AppError('bad-input', { fields });
  await lockRowSamples(context.tx, { organisationId: context.actor.organisationId, rowSampleIds: [rowSample.id] });
  return {
    ...seen,
    visitColumns: { rowSampleId: rowSample.id, visitId: body.visit.id },
    keepVisit: () => keepVisit(context, rowSample.id, body.visit, farm.timeZone),
    isSameVisit: (row: { rowSampleId: string; visitId: string; visitedOn: string; visitedAt: string | null; visitMarker: string | null; personId: string }) =>
      row.rowSampleId === rowSample.id && row.visitId === body.visit.id && row.visitedOn === body.visit.visitedOn &&
      row.visitedAt === body.visit.visitedAt && row.visitMarker === body.visit.marker && row.personId === (body.visit.personId ?? context.actor.personId),
  };
}
