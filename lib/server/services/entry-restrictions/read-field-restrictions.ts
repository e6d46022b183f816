import 'server-only';
import { Temporal } from 'temporal-polyfill';
import { can } from '@/lib/access/can';
import type { ReadContext } from '../../operations/context';
import { findSeenField } from '../fields/find-seen-field';
import { readRestrictions, type FieldRestriction } from './read-restrictions';

const secondsPerHour = 3_600;

/** The applications in a field, the one that keeps people out longest first: until when each keeps people out, and who went in under which exception. */
export async function readFieldRestrictions(context: ReadContext, fieldId: string) {
  const { tx, actor, clock, organisation } = context;
  const { field, farm } = await findSeenField(context, fieldId);
  const restrictions = (await readRestrictions(tx, { organisationId: actor.organisationId })).filter((each) => each.fieldId === field.id);
  const today = clock.today(farm.timeZone);
  // An organisation with a day of its own has no time of day; its noon stands for it.
  const now = organisation.demoToday === null
    ? Temporal.Instant.fromEpochMilliseconds(clock.now().getTime())
    : Temporal.PlainDateTime.from(`${today}T12:00`).toZonedDateTime(farm.timeZone).toInstant();
  return {
    today,
    mayWrite: can(actor, 'observations.write'),
    restrictions: restrictions.map((restriction) => shown(restriction, now)).sort((a, b) => (`${a.untilOn} ${a.untilAt}` < `${b.untilOn} ${b.untilAt}` ? 1 : -1)),
  };
}
export type FieldRestrictions = Awaited<ReturnType<typeof readFieldRestrictions>>;

function shown({ id, product, endedOn, endedAt, timeZone, hours, personName, exceptions }: FieldRestriction, now: Temporal.Instant) {
  // Of an hour that comes twice, the later one: people stay out longer, not shorter.
  const ended = Temporal.PlainDateTime.from(`${endedOn}T${endedAt}`).toZonedDateTime(timeZone, { disambiguation: 'later' });
  const until = ended.add({ seconds: Math.ceil(hours * secondsPerHour) });
  return {
    id, product, endedOn, endedAt, hours, personName,
    untilOn: until.toPlainDate().toString(),
    untilAt: until.toPlainTime().toString({ smallestUnit: 'minute', roundingMode: 'ceil' }),
    isOver: Temporal.Instant.compare(until.toInstant(), now) <= 0,
    exceptions: exceptions.map(({ id: exceptionId, enteredOn, exception, equipment, personName: enteredBy }) => ({ id: exceptionId, enteredOn, exception, equipment, personName: enteredBy })),
  };
}
