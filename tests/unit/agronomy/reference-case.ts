type Case = { id: string; input: unknown; expected: unknown };

/** One case of a reference file, by its id, as the shape the test says it has. */
export function referenceCase<Input, Expected>(
  cases: readonly Case[],
  id: string,
): { input: Input; expected: Expected } {
  const found = cases.find((candidate) => candidate.id === id);
  if (!found) throw new Error(`There is no reference case ${id}.`);
  return { input: found.input as Input, expected: found.expected as Expected };
}
