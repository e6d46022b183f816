import { Temporal } from 'temporal-polyfill';

/** The one clock. Services take it as an argument, so that a test or a demo can stand on a day of its own. */
export type Clock = {
  now: () => Date;
  /** The local calendar day in a zone, or the organisation's fixed day where it has one. */
  today: (timeZone: string) => string;
};

export function clockAt(now: () => Date, fixedToday: string | null = null): Clock {
  return {
    now,
    today: (timeZone) =>
      fixedToday ??
      Temporal.Instant.fromEpochMilliseconds(now().getTime()).toZonedDateTimeISO(timeZone).toPlainDate().toString(),
  };
}

export const wallClock = clockAt(() => new Date());
