import 'server-only';
import type { z } from 'zod';
import { AppError } from '@/lib/errors/app-error';
import { currentPerson, type SignedIn } from '../session/current-person';
import { parse } from './parse';
import { readJson } from './read-json';
import { answering, respond } from './respond';
import { assertSameOrigin } from './same-origin';

/** What a route without an organisation knows of the request besides its body. */
export type Caller = { socketAddress: string };

// Set by the server itself over whatever a client sent (see instrumentation.ts), so it is the socket's own.
const callerOf = (request: Request): Caller => ({ socketAddress: request.headers.get('x-rowrise-socket-address') ?? 'unknown' });

/** A writing route that anybody may call, such as signing in. */
export function openRoute<Body extends z.ZodType>(declared: {
  body: Body;
  service: (body: z.output<Body>, caller: Caller) => Promise<unknown>;
}) {
  return (request: Request) =>
    answering(async () => {
      assertSameOrigin(request);
      return respond((await declared.service(parse(declared.body, await readJson(request)), callerOf(request))) ?? {});
    });
}

/** A writing route about the signed-in person themself, outside any organisation. */
export function personRoute<Body extends z.ZodType>(declared: {
  body: Body;
  service: (person: SignedIn, body: z.output<Body>, caller: Caller) => Promise<unknown>;
}) {
  return (request: Request) =>
    answering(async () => {
      assertSameOrigin(request);
      const person = await currentPerson();
      if (!person) throw new AppError('not-signed-in');
      return respond((await declared.service(person, parse(declared.body, await readJson(request)), callerOf(request))) ?? {});
    });
}

/** A reading route about the signed-in person themself, outside any organisation. */
export function personReadRoute(service: (person: SignedIn) => Promise<unknown>) {
  return () =>
    answering(async () => {
      const person = await currentPerson();
      if (!person) throw new AppError('not-signed-in');
      return respond(await service(person));
    });
}
