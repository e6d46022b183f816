import type { Things } from './demo-things';

/**
 * Who gets what, reviewed by hand: for every page and route the status that each person is answered with, for
 * a thing [of their own | on a farm they are not attached to | of another organisation | that never existed].
 * Owners and agronomists see every farm of their organisation. A dash says that there is no such thing to ask about.
 */
export type Status = number | '-';
export type Statuses = readonly [own: Status, notAssigned: Status, another: Status, never: Status];
export type Insider = 'scout' | 'agronomist' | 'grower' | 'owner';
export const insiders = ['scout', 'agronomist', 'grower', 'owner'] as const;

export type PageRow = { noun?: keyof Things; who: Record<Insider, Statuses> };

const closed = [404, 404, 404, 404] as const;
const closedAnywhere = [404, '-', 404, 404] as const;
const everyFarm = [200, 200, 404, 404] as const;
const ownFarms = [200, 404, 404, 404] as const;
const anyoneInside = [200, '-', 404, 404] as const;

/** Under a page of an organisation without a thing in its address, "another" and "never" are organisations. */
const org = (scout: Statuses, agronomist: Statuses, grower: Statuses, owner: Statuses): PageRow => ({ who: { scout, agronomist, grower, owner } });
const of = (noun: keyof Things, scout: Statuses, agronomist: Statuses, grower: Statuses, owner: Statuses): PageRow => ({ noun, who: { scout, agronomist, grower, owner } });

// prettier-ignore
export const pagesOfOrganisation: Record<string, PageRow> = {
  //                                                         scout           agronomist    grower          owner
  '/o/[org]':                                            org(anyoneInside,   anyoneInside, anyoneInside,   anyoneInside),
  '/o/[org]/farms':                                      org(anyoneInside,   anyoneInside, anyoneInside,   anyoneInside),
  '/o/[org]/people':                                     org(closedAnywhere, anyoneInside, closedAnywhere, anyoneInside),
  '/o/[org]/kept-file':                                  org(closedAnywhere, anyoneInside, closedAnywhere, anyoneInside),
  '/o/[org]/changes':                                    org(closedAnywhere, anyoneInside, closedAnywhere, anyoneInside),
  '/o/[org]/settings':                                   org(closedAnywhere, anyoneInside, closedAnywhere, anyoneInside),
  '/o/[org]/farms/[farm]':                               of('farm',      ownFarms, everyFarm, ownFarms, everyFarm),
  '/o/[org]/fields/[field]':                             of('field',     ownFarms, everyFarm, ownFarms, everyFarm),
  '/o/[org]/plantings/[planting]/plan':                  of('planting',  ownFarms, everyFarm, ownFarms, everyFarm),
  '/o/[org]/plantings/[planting]/count':                 of('planting',  ownFarms, everyFarm, ownFarms, everyFarm),
  '/o/[org]/plantings/[planting]/count/[rowSample]':     of('rowSample', ownFarms, everyFarm, ownFarms, everyFarm),
  '/o/[org]/plantings/[planting]/import':                of('planting',  ownFarms, everyFarm, closed,   everyFarm),
  '/o/[org]/plantings/[planting]/scores':                of('planting',  ownFarms, everyFarm, ownFarms, everyFarm),
  '/o/[org]/plantings/[planting]/compare':               of('planting',  closed,   everyFarm, ownFarms, everyFarm),
  '/o/[org]/plantings/[planting]/decide':                of('planting',  closed,   everyFarm, ownFarms, everyFarm),
};

/** Pages outside any organisation: the status for somebody who is signed out, and for everybody who is signed in. */
export const pagesOfNobody: Record<string, { signedOut: number; signedIn: number }> = {
  '/': { signedOut: 307, signedIn: 307 },
  '/sign-in': { signedOut: 200, signedIn: 200 },
  '/methods': { signedOut: 200, signedIn: 200 },
  '/preferences': { signedOut: 307, signedIn: 200 },
  '/link/[secret]': { signedOut: 200, signedIn: 200 },
  // A page without anything of anybody in it; what it shows comes out of the phone's own store.
  '/round': { signedOut: 200, signedIn: 200 },
  '/[...missing]': { signedOut: 404, signedIn: 404 },
};

const barred = [403, 403, 403, 403] as const;

// prettier-ignore
export const readsOfOrganisation: Record<string, PageRow> = {
  'GET /api/o/[org]/plantings/[planting]/scores':     of('planting', ownFarms, everyFarm, ownFarms, everyFarm),
  'GET /api/o/[org]/plantings/[planting]/comparison': of('planting', barred,   everyFarm, ownFarms, everyFarm),
  'GET /api/o/[org]/round-day':                        org(anyoneInside,      anyoneInside, anyoneInside, anyoneInside),
  // No photo stands in the demo: who sees one is tested where photos are made, in tests/integration/photos.test.ts.
  'GET /api/o/[org]/photos/[photo]':                  of('planting', closed,   closed,    closed,    closed),
  'GET /api/o/[org]/plantings/[planting]/replant':    of('planting', barred,   everyFarm, ownFarms, everyFarm),
};

/** Routes outside any organisation, called with a body that none of them takes, so that nothing is done. */
export const routesOfNobody: Record<string, { signedOut: number; signedIn: number }> = {
  'GET /api/health': { signedOut: 200, signedIn: 200 },
  'GET /round-worker.js': { signedOut: 200, signedIn: 200 },
  'GET /api/round': { signedOut: 401, signedIn: 200 },
  'POST /api/links/open': { signedOut: 422, signedIn: 422 },
  'POST /api/sign-in': { signedOut: 422, signedIn: 422 },
  'POST /api/sign-out': { signedOut: 422, signedIn: 422 },
  'POST /api/password': { signedOut: 401, signedIn: 422 },
  'POST /api/preferences': { signedOut: 401, signedIn: 422 },
};

/** What a phone saved to a file, read in at the office by owner or agronomist as its author's. */
export const keptFileRoute = 'POST /api/o/[org]/kept-files';

/** Raw uploads: the one route that takes something other than JSON. */
export const uploadRoute = 'PUT /api/o/[org]/photos/[photo]';
