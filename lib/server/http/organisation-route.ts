import 'server-only';
import { z } from 'zod';
import { can, type Action } from '@/lib/access/can';
import { AppError } from '@/lib/errors/app-error';
import { wallClock } from '../clock';
import { database } from '../database';
import { withActor } from '../operations/actor-context';
import type { ReadContext } from '../operations/context';
import { currentPerson } from '../session/current-person';
import { parse, parseIds } from './parse';
import { answering, respond } from './respond';

type Context = { params: Promise<Record<string, string | string[] | undefined>> };

const organisationSchema = z.object({ org: z.uuid() });

/**
 * A reading route of an organisation: who may ask, the ids in its address, its query, and the one service that answers.
 * Signed-out people, strangers and colleagues without the role are turned away before the service is called.
 */
export function readRoute<Ids extends z.ZodObject, Query extends z.ZodType>(declared: {
  action: Action;
  ids: Ids;
  query: Query;
  service: (context: ReadContext, input: z.output<Ids> & z.output<Query>) => Promise<unknown>;
}) {
  return (request: Request, context: Context) =>
    answering(async () => {
      const person = await currentPerson();
      if (!person) throw new AppError('not-signed-in');
      const address = await context.params;
      const { org } = parseIds(organisationSchema, address);
      const answer = await withActor(database(), { organisationId: org, personId: person.personId, now: wallClock.now }, (read) => {
        if (!can(read.actor, declared.action)) throw new AppError('forbidden');
        const ids = parseIds(declared.ids, address);
        const query = parse(declared.query, Object.fromEntries(new URL(request.url).searchParams));
        return declared.service(read, Object.assign({}, ids, query));
      });
      return respond(answer);
    });
}
