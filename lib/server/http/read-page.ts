import 'server-only';
import { notFound, redirect } from 'next/navigation';
import { z } from 'zod';
import { can, type Action, type Actor } from '@/lib/access/can';
import { AppError } from '@/lib/errors/app-error';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { wallClock } from '../clock';
import { database } from '../database';
import { withActor } from '../operations/actor-context';
import type { ReadContext } from '../operations/context';
import { currentPerson } from '../session/current-person';

export type PageReader = {
  actor: Actor;
  units: UnitSystem;
  organisation: ReadContext['organisation'];
  today: string;
};

/**
 * What a server page reads, inside one transaction of the organisation in its address. A person who is not signed in goes
 * to the sign-in page; what is not theirs to see is not found.
 */
export async function readPage<T>(
  organisationId: string,
  action: Action,
  work: (context: ReadContext) => Promise<T>,
): Promise<PageReader & { data: T }> {
  const person = await currentPerson();
  if (!person) redirect('/sign-in');
  if (!z.uuid().safeParse(organisationId).success) notFound();
  try {
    return await withActor(database(), { organisationId, personId: person.personId, now: wallClock.now }, async (context) => {
      if (!can(context.actor, action)) throw new AppError('not-found');
      const data = await work(context);
      const { actor, organisation, clock } = context;
      return { actor, organisation, units: person.units, today: clock.today(organisation.timeZone), data };
    });
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') notFound();
    throw error;
  }
}
