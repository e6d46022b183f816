/** The wall time in a zone, as the people there read it off a clock. */
export type WallTime = { date: string; time: string };

const formats = new Map<string, Intl.DateTimeFormat>();

function formatOf(zone: string): Intl.DateTimeFormat {
  let format = formats.get(zone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-CA', { timeZone: zone, year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });
    formats.set(zone, format);
  }
  return format;
}

/** What the clocks of a zone say at an instant, given in milliseconds. */
export function wallTimeAt(instant: number, zone: string): WallTime {
  const part = Object.fromEntries(formatOf(zone).formatToParts(instant).map(({ type, value }) => [type, value]));
  return { date: `${part.year}-${part.month}-${part.day}`, time: `${part.hour}:${part.minute}` };
}
