export type StandingWords = { personName: string; number: string; when: string };

/** The version that stands on the server, as far as it says: who, when, how many. */
export function standingWords(standing: Record<string, unknown> | undefined): StandingWords | undefined {
  if (!standing || typeof standing.personName !== 'string') return undefined;
  const number = [standing.plants, standing.hours].find((each) => typeof each === 'number');
  const when = [standing.visitedOn, standing.endedOn].find((each) => typeof each === 'string');
  return { personName: standing.personName, number: number === undefined ? '' : `${standing.countedAs === 'new' ? '+' : ''}${String(number)}`, when: typeof when === 'string' ? when : '' };
}
