import { insiders, pagesOfOrganisation, readsOfOrganisation, type Insider, type Statuses } from './access-table';
import { organisations, places, things, type Place, type Things } from './demo-things';
import { Visitor, type Reply } from './visitor';
import { writesOfOrganisation } from './write-table';

/** One question to the server: what is asked for, and what the table says the answer must be for each insider. */
export type Question = {
  what: string;
  place: Place;
  who: Record<Insider, number>;
  ask: (visitor: Visitor, org: string, expected: number) => Promise<Reply>;
};

const emails: Record<Insider, string> = {
  scout: 'pell@quillfern.example',
  agronomist: 'agronomist@quillfern.example',
  grower: 'hollis@quillfern.example',
  owner: 'owner@quillfern.example',
};
const personKeys: Record<Insider, string> = { scout: 'scout-one', agronomist: 'agronomist', grower: 'grower-one', owner: 'owner' };

export async function signInInsiders(idOf: (name: string) => string): Promise<Record<Insider, Visitor>> {
  const visitors = insiders.map(async (insider) => {
    const visitor = new Visitor(idOf(`quillfern/${personKeys[insider]}`));
    await visitor.signIn(emails[insider]);
    return [insider, visitor] as const;
  });
  return Object.fromEntries(await Promise.all(visitors)) as Record<Insider, Visitor>;
}

/** An address with its parameters filled in; a zone, a person or a count stands in none. */
export const filledIn = (address: string, org: string, it: Things): string =>
  address.replace(/\[(\w+)\]/g, (_, name: string) => (name === 'org' ? org : (it[name as keyof Things] ?? `no-${name}`)));

function expectedAt(who: Record<Insider, Statuses>, index: number): Record<Insider, number> | undefined {
  const found = insiders.map((insider) => [insider, who[insider][index]] as const);
  return found.some(([, status]) => status === '-') ? undefined : (Object.fromEntries(found) as Record<Insider, number>);
}

function eachPlace(who: Record<Insider, Statuses>, make: (place: Place) => Omit<Question, 'place' | 'who'>): Question[] {
  return places.flatMap((place, index) => {
    const expected = expectedAt(who, index);
    return expected ? [{ place, who: expected, ...make(place) }] : [];
  });
}

/** For a row without a thing in its address, another's and never existing are said of the organisation. */
const orgAt = (org: string, place: Place, hasThing: boolean) => (hasThing || place === 'own' || place === 'notAssigned' ? org : organisations[place]);

export function readQuestions(): Question[] {
  const rows = Object.entries({ ...pagesOfOrganisation, ...readsOfOrganisation });
  return rows.flatMap(([what, { noun, who }]) =>
    eachPlace(who, (place) => ({
      what,
      ask: (visitor, org) => visitor.get(filledIn(what.replace(/^GET /, ''), orgAt(org, place, noun !== undefined), things[place])),
    })),
  );
}

export function writeQuestions(): Question[] {
  return Object.entries(writesOfOrganisation).flatMap(([route, rows]) =>
    rows.flatMap(({ kind, who, sent }) =>
      eachPlace(who, (place) => ({
        what: `${route} ${kind}`,
        ask: (visitor, org, expected) =>
          visitor.send(filledIn(route.replace(/^POST /, ''), org, things[place]), org, { kind, ...sent(things[place], expected) }),
      })),
    ),
  );
}

/** Asks everything, a few at a time, in the order of the questions. */
export async function inTurn<In, Out>(inputs: readonly In[], work: (input: In) => Promise<Out>, atOnce = 4): Promise<Out[]> {
  const results: Out[] = [];
  for (let from = 0; from < inputs.length; from += atOnce) {
    results.push(...(await Promise.all(inputs.slice(from, from + atOnce).map(work))));
  }
  return results;
}

/** What a person can read in an answer, with the ids they asked with taken out, so that two answers can be held side by side. */
export function readable({ status, text }: Reply): string {
  const ids = /[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}/g;
  const words = text.replace(/<(script|style)\b[\s\S]*?<\/\1>/g, ' ').replace(/<[^>]*>/g, ' ').replace(/\s+/g, ' ');
  return `${status} ${words.replace(ids, 'an-id')}`;
}
