import type { RoundCount, RoundDig, RoundRow, RoundTapeSheet } from '@/lib/schemas/round-day';
import { resolveCounts } from '@/lib/schemas/resolve-counts';
import type { KeptEntry } from './entry';

type Visit = { id: string; personId: string | null; visitedOn: string; visitedAt: string | null; marker: string | null };
type Me = { id: string; name: string };

/**
 * A row sample as the scout knows it: what the day brought, with what this phone kept since on top, in the order it was
 * kept. An entry that the server refused stays out until it has been looked at, except that its number is still shown
 * among what needs a look.
 */
export function mergeRow(row: RoundRow, entries: readonly KeptEntry[], me: Me): RoundRow {
  const standing = entries.filter((entry) => entry.state !== 'needs-look');
  if (standing.length === 0) return row;
  const withdrawn = new Set(standing.flatMap((entry) => (entry.kind === 'observation.withdraw' ? [String(entry.body.targetId)] : [])));
  const replaced = new Set(standing.flatMap((entry) => (typeof entry.body.replacesId === 'string' ? [entry.body.replacesId] : [])));
  const join = <Each extends { id: string }>(before: readonly Each[], kind: string, make: (entry: KeptEntry) => Each): Each[] => {
    const known = new Set(before.map((each) => each.id));
    const added = standing.filter((entry) => entry.kind === kind && !known.has(entry.thingId)).map(make);
    return [...before, ...added].filter((each) => !withdrawn.has(each.id) && !replaced.has(each.id));
  };
  const visitOf = (entry: KeptEntry) => entry.body.visit as Visit;
  const typed = <T,>(entry: KeptEntry) => entry.body as T;
  const recorded = join<RoundCount>(row.counts, 'count.record', (entry) => {
    const { countedAs, plants, doubtful } = typed<Pick<RoundCount, 'countedAs' | 'plants' | 'doubtful'>>(entry);
    const { id, visitedOn, visitedAt, marker } = visitOf(entry);
    return { id: entry.thingId, visitId: id, visitedOn, visitedAt, marker, personId: me.id, personName: me.name, countedAs, plants, plantsUp: plants, doubtful, used: true };
  });
  return {
    ...row,
    counts: resolveCounts(recorded),
    tapeSheets: join<RoundTapeSheet>(row.tapeSheets, 'tape-sheet.record', (entry) => {
      const sheet = typed<Partial<RoundTapeSheet> & Pick<RoundTapeSheet, 'tapeUnit' | 'places'>>(entry);
      const { id, visitedOn, visitedAt, marker } = visitOf(entry);
      return {
        id: entry.thingId, visitId: id, visitedOn, visitedAt, visitMarker: marker, personId: me.id, personName: me.name, tapeUnit: sheet.tapeUnit,
        readFrom: sheet.readFrom ?? 'start', zeroAt: sheet.zeroAt ?? 'mark', segmentStarts: sheet.segmentStarts ?? [], places: sheet.places,
      };
    }),
    depths: join(row.depths, 'depth.record', (entry) => {
      const { unit, depths } = typed<{ unit: 'in' | 'cm'; depths: string[] }>(entry);
      return { id: entry.thingId, visitId: visitOf(entry).id, visitedOn: visitOf(entry).visitedOn, unit, depths, personName: me.name };
    }),
    cover: join(row.cover, 'residue.record', (entry) => ({ id: entry.thingId, ...typed<{ readOn: string; marksRead: number; marksCovered: number }>(entry) })),
    digs: join<RoundDig>(row.digs, 'dig.record', (entry) => ({
      ...typed<Omit<RoundDig, 'id' | 'visitedOn' | 'personName'>>(entry), id: entry.thingId, visitedOn: visitOf(entry).visitedOn, personName: me.name,
    })),
    crusts: join(row.crusts, 'crust.record', (entry) => ({
      ...typed<{ sproutsSound: number; sproutsDead: number; crust: string }>(entry), id: entry.thingId, visitedOn: visitOf(entry).visitedOn, personName: me.name,
    })),
    markers: join(row.markers, 'markers.record', (entry) => ({
      ...typed<{ event: 'set' | 'taken-up'; happenedOn: string; markers: number }>(entry), id: entry.thingId, personName: me.name,
    })),
  };
}
