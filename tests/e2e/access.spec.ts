import { readdirSync } from 'node:fs';
import { expect, test } from '@playwright/test';
import { demoId } from '@/db/demo/demo-id';
import { insiders, pagesOfNobody, pagesOfOrganisation, readsOfOrganisation, keptFileRoute, routesOfNobody, uploadRoute, type Insider } from './support/access-table';
import { filledIn, inTurn, readable, readQuestions, signInInsiders, writeQuestions, type Question } from './support/ask';
import { organisations, things } from './support/demo-things';
import { discoveredPages, discoveredRoutes } from './support/discovered-routes';
import { baseUrl, Visitor, type Reply } from './support/visitor';
import { batchRoute, writesOfOrganisation } from './support/write-table';

test.describe.configure({ mode: 'serial', timeout: 300_000 });

const canaries = /marrowglass|thistlewick/i;
const signedOut = new Visitor(demoId('quillfern/owner'));
const outsider = new Visitor(demoId('marrowglass/owner'));
let people: Record<Insider, Visitor>;

test.beforeAll(async () => {
  people = await signInInsiders(demoId);
  await outsider.signIn('owner@marrowglass.example');
});

const questions = (): Question[] => [...readQuestions(), ...writeQuestions()];
const ofKind = (question: Question) => (question.what.startsWith('/') ? 'page' : 'interface');
const asked = (question: Question, who: string) => `${who}: ${question.what}, ${question.place}`;

/** Asks as one person and says which answers differ from what was expected, all of them at once. */
async function surprises(who: string, visitor: Visitor, list: readonly Question[], expectedOf: (question: Question) => number, org = organisations.own) {
  const answers = await inTurn(list, async (question) => ({ question, reply: await question.ask(visitor, org, expectedOf(question)) }));
  return answers
    .filter(({ question, reply }) => reply.status !== expectedOf(question) || (who !== 'outsider' && canaries.test(reply.text)))
    .map(({ question, reply }) => `${asked(question, who)}: ${reply.status} for ${expectedOf(question)}${canaries.test(reply.text) ? ', with a word of another organisation in it' : ''}`);
}

test('every page and every route of the application stands in the table, and nothing else does', () => {
  expect(discoveredPages()).toEqual([...Object.keys(pagesOfOrganisation), ...Object.keys(pagesOfNobody)].sort());
  const listed = [...Object.keys(readsOfOrganisation), ...Object.keys(routesOfNobody), ...Object.keys(writesOfOrganisation), batchRoute, uploadRoute, keptFileRoute];
  expect(discoveredRoutes()).toEqual(listed.sort());
});

test('every kind of write stands in the table', () => {
  const kinds = readdirSync('tests/fixtures/operations').map((name) => name.replace(/\.v\d+\.json$/, ''));
  const listed = Object.values(writesOfOrganisation).flatMap((rows) => rows.map(({ kind }) => kind));
  expect(listed.sort()).toEqual([...new Set(kinds)].sort());
});

for (const insider of insiders) {
  test(`the ${insider} is answered as the table says, and reads no other organisation's word`, async () => {
    expect(await surprises(insider, people[insider], questions(), (question) => question.who[insider])).toEqual([]);
  });

  test(`the ${insider} cannot tell what is another organisation's from what never existed`, async () => {
    const visitor = people[insider];
    const another = questions().filter((question) => question.place === 'another');
    const never = questions().filter((question) => question.place === 'never');
    const pairs = await inTurn(another, async (question) => {
      const twin = never.find((each) => each.what === question.what);
      const expected = question.who[insider];
      const first = readable(await question.ask(visitor, organisations.own, expected));
      return [asked(question, insider), first, twin ? readable(await twin.ask(visitor, organisations.own, expected)) : 'no twin'] as const;
    });
    expect(pairs.filter(([, first, second]) => first !== second)).toEqual([]);
  });

  test(`the ${insider} finds nothing under another organisation's address, as under one that never was`, async () => {
    const own = questions().filter((question) => question.place === 'another');
    const found = await inTurn(own, async (question) => {
      const [there, nowhere] = [await question.ask(people[insider], organisations.another, 404), await question.ask(people[insider], organisations.never, 404)];
      return { what: asked(question, insider), status: there.status, alike: readable(there) === readable(nowhere), leaked: canaries.test(there.text) };
    });
    expect(found.filter(({ status, alike, leaked }) => status !== 404 || !alike || leaked)).toEqual([]);
  });
}

test('somebody signed out is sent to sign in, or refused', async () => {
  expect(await surprises('signed out', signedOut, questions(), (question) => (ofKind(question) === 'page' ? 307 : 401))).toEqual([]);
  // The header with which a whole framework once let everybody past its proxy.
  const past = await signedOut.request(`/o/${organisations.own}/people`, { headers: { 'x-middleware-subrequest': 'proxy:proxy:proxy:proxy:proxy' } });
  expect([past.status, past.headers.get('location')]).toEqual([307, '/sign-in']);
});

test('somebody of another organisation finds nothing at all', async () => {
  const atHome = questions().filter((question) => question.place === 'own' || question.place === 'notAssigned');
  expect(await surprises('outsider', outsider, atHome, () => 404)).toEqual([]);
});

test('a thing of another place does not open under a planting that one sees', async () => {
  const { owner, scout } = people;
  const planting = `/o/${organisations.own}/plantings/${things.own.planting}`;
  for (const place of ['notAssigned', 'another', 'never'] as const) {
    for (const visitor of [owner, scout]) expect((await visitor.get(`${planting}/count/${things[place].rowSample}`)).status).toBe(404);
    expect((await owner.get(`${planting}/decide?zone=${things[place].zone}`)).status).toBe(404);
    expect((await owner.get(`/api${planting}/replant?zone=${things[place].zone}`)).status).toBe(404);
  }
});

test('the batch is for members only, and answers each entry for itself', async () => {
  const path = filledIn(batchRoute.replace('POST ', ''), organisations.own, things.own);
  for (const insider of insiders) {
    expect((await people[insider].post(path, { operations: [] })).status).toBe(422);
    for (const org of [organisations.another, organisations.never]) {
      const reply = await people[insider].post(`/api/o/${org}/operations`, { operations: [{}] });
      expect([reply.status, canaries.test(reply.text)]).toEqual([404, false]);
    }
  }
  expect((await signedOut.post(path, { operations: [{}] })).status).toBe(401);
  expect((await outsider.post(path, { operations: [{}] })).status).toBe(404);
});

test('a file that a phone saved is read in by owner and agronomist, as its author, and nobody signs for somebody else', async () => {
  const path = (org: string) => `/api/o/${org}/kept-files`;
  const entry = (kind: string) => ({
    operationId: crypto.randomUUID(), organisationId: organisations.own, personId: people.scout.personId, deviceId: crypto.randomUUID(), deviceSequence: 1, kind, version: 1, thingId: crypto.randomUUID(),
    body: {}, occurred: { date: '2026-05-26', time: null, zone: 'America/Chicago' },
  });
  for (const insider of ['scout', 'grower'] as const) expect((await people[insider].post(path(organisations.own), { operations: [entry('note.record')] })).status).toBe(403);
  for (const insider of ['owner', 'agronomist'] as const) {
    const reply = await people[insider].post(path(organisations.own), { operations: [entry('note.record'), entry('decision.sign'), entry('farm.add')] });
    const { answers } = JSON.parse(reply.text) as { answers: { code: string }[] };
    expect([reply.status, ...answers.map((answer) => answer.code).sort()]).toEqual([200, 'bad-input', 'unknown-kind', 'unknown-kind']);
    for (const org of [organisations.another, organisations.never]) expect((await people[insider].post(path(org), { operations: [entry('note.record')] })).status).toBe(404);
  }
  expect((await signedOut.post(path(organisations.own), { operations: [entry('note.record')] })).status).toBe(401);
});

test('a photo is taken in only from a member, of a photo that was recorded, and as a picture from our own pages', async () => {
  const photo = (org: string) => `/api/o/${org}/photos/${things.never.planting}`;
  const put = (visitor: Visitor, org: string, headers: Record<string, string> = {}) => visitor.request(photo(org), { method: 'PUT', body: 'no picture', headers: { 'Content-Type': 'image/jpeg', Origin: baseUrl(), ...headers } });
  const statuses = async (visitor: Visitor) => inTurn([organisations.own, organisations.another, organisations.never], async (org) => (await put(visitor, org)).status);
  expect(await statuses(people.scout)).toEqual([409, 404, 404]);
  expect(await statuses(people.agronomist)).toEqual([409, 404, 404]);
  expect(await statuses(people.grower)).toEqual([403, 404, 404]);
  expect(await statuses(signedOut)).toEqual([401, 401, 401]);
  expect((await put(people.scout, organisations.own, { Origin: 'https://elsewhere.example' })).status).toBe(403);
  expect((await put(people.scout, organisations.own, { 'Content-Type': 'text/html' })).status).toBe(415);
});

test('outside any organisation each page and route answers as listed', async () => {
  const addresses: Record<string, string> = { '/link/[secret]': '/link/no-such-secret-was-ever-made', '/[...missing]': '/nothing/stands/here' };
  for (const [who, visitor] of [['signedOut', signedOut], ['signedIn', people.scout]] as const) {
    for (const [address, expected] of Object.entries(pagesOfNobody)) {
      const reply = await visitor.get(addresses[address] ?? address);
      expect([who, address, reply.status, canaries.test(reply.text)]).toEqual([who, address, expected[who], false]);
    }
    for (const [route, expected] of Object.entries(routesOfNobody)) {
      const [method, path] = route.split(' ') as [string, string];
      const reply = method === 'GET' ? await visitor.get(path) : await visitor.post(path, 'no object');
      expect([who, route, reply.status]).toEqual([who, route, expected[who]]);
    }
  }
});

test('what our pages fetch for themselves tells a stranger no more than the page', async () => {
  const list = readQuestions().filter((question) => ofKind(question) === 'page' && question.place !== 'own');
  const leaks = await inTurn(list, async (question) => {
    const it = things[question.place];
    const reply: Reply = await people.scout.request(filledIn(question.what, organisations.own, it), { headers: { RSC: '1' } });
    return { what: asked(question, 'scout'), leaked: canaries.test(reply.text) };
  });
  expect(leaks.filter(({ leaked }) => leaked)).toEqual([]);
});
