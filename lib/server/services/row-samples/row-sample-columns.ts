import type { RowSampleInput } from '@/lib/schemas/row-sample';
import { readingColumns } from '../../operations/reading-columns';

/** The columns that a row sample's body fills, the same when it is added and when it is changed. */
export function rowSampleColumns(body: RowSampleInput) {
  const { stripId, zoneId, label, planterRow, startEnd, farEnd } = body;
  return { stripId, zoneId, label, planterRow, startEnd, farEnd, ...readingColumns('length', body.length) };
}
