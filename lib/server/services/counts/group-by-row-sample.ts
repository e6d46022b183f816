/** Observations by the row sample they were made at, each group in the order given. */
export function groupByRowSample<Row extends { rowSampleId: string }>(rows: readonly Row[]): Map<string, Row[]> {
  const groups = new Map<string, Row[]>();
  for (const row of rows) {
    const group = groups.get(row.rowSampleId);
    if (group) group.push(row);
    else groups.set(row.rowSampleId, [row]);
  }
  return groups;
}
