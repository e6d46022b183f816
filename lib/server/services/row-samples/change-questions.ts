import type { Question } from '@/lib/errors/app-error';
import type { RowSampleInput } from '@/lib/schemas/row-sample';
import type { RowSampleRow } from '../../data/row-sample';

/** A counted row that becomes longer, ends otherwise or lies elsewhere changes what its counts say, so it is asked about. */
export function changeQuestions(before: RowSampleRow, now: RowSampleInput): Question[] {
  const measuredOtherwise =
    before.lengthTyped !== now.length.typed || before.lengthUnit !== now.length.unit || before.startEnd !== now.startEnd || before.farEnd !== now.farEnd;
  const elsewhere = before.stripId !== now.stripId || before.zoneId !== now.zoneId;
  const about = before.id;
  return [
    ...(measuredOtherwise
      ? [{ rule: 'counted-row-measured-otherwise', about, sentence: `Row sample ${before.label} has been counted. With another length or other ends its plants per acre and places are figured anew. Is that right?` }]
      : []),
    ...(elsewhere
      ? [{ rule: 'counted-row-moved', about, sentence: `Row sample ${before.label} has been counted. Its counts move along to the other place. Is that right?` }]
      : []),
  ];
}
