type Recorded = { id: string; replacesId: string | null };

/** Which record now stands where this one stood, through however many corrections; undefined where it was taken back. */
export function standingInstead<Row extends Recorded>(recorded: readonly Row[], standing: ReadonlySet<string>, id: string): Row | undefined {
  const byId = new Map(recorded.map((row) => [row.id, row]));
  const stemsFrom = (row: Row | undefined): boolean => row !== undefined && (row.replacesId === id || (row.replacesId !== null && stemsFrom(byId.get(row.replacesId))));
  return recorded.find((row) => standing.has(row.id) && stemsFrom(row));
}
