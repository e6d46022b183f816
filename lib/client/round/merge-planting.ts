import type { RoundDay, RoundField, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { rowAreaAcres } from '@/lib/agronomy/stand';
import { parseReading, readingIn, type Reading } from '@/lib/schemas/reading';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import type { KeptEntry } from './entry';

type Typed = { typed: string; unit?: ReadingUnit };

const inUnit = ({ typed, unit }: Typed, fallback: ReadingUnit, wanted: ReadingUnit): { reading: Reading | null; amount: number } => {
  const parsed = parseReading(typed, { unit: unit ?? fallback, otherUnits: ['in', 'ft', 'cm', 'm', 'per-acre', 'per-ha'].filter((each) => each !== unit) as ReadingUnit[], least: 0, most: 1e9, thousandsComma: wanted === 'per-acre', name: 'reading' });
  return parsed.ok ? { reading: parsed.reading, amount: readingIn(parsed.reading, wanted) } : { reading: null, amount: 0 };
};

/** A planting as the scout knows it: what the day brought, with what this phone kept since; one begun on this phone too. */
export function mergePlanting(day: RoundDay | null, plantingId: string, entries: readonly KeptEntry[], myName: string): RoundPlanting | undefined {
  const standing = entries.filter((entry) => entry.state !== 'needs-look');
  const base = day?.plantings.find((each) => each.id === plantingId) ?? begunHere(plantingId, entries);
  if (!base || standing.length === 0) return base;
  const withdrawn = new Set(standing.flatMap((entry) => [entry.body.targetId, entry.body.replacesId].filter((id) => typeof id === 'string')));
  const join = <Each extends { id: string }>(before: readonly Each[], kind: string): Each[] => {
    const known = new Set(before.map((each) => each.id));
    const added = standing.filter((entry) => entry.kind === kind && !known.has(entry.thingId)).map((entry) => ({ ...entry.body, id: entry.thingId, personName: myName }) as unknown as Each);
    return [...before, ...added].filter((each) => !withdrawn.has(each.id));
  };
  const places = standing.filter((entry) => entry.kind === 'spot-place.add' && !base.rows.some((row) => row.id === entry.thingId));
  return {
    ...base,
    transects: join(base.transects, 'transect.record'),
    conditions: join(base.conditions, 'condition.record'),
    notes: join(base.notes, 'note.record'),
    rows: [...base.rows, ...places.map((entry) => placeBegunHere(entry, base))],
  };
}

function begunHere(plantingId: string, entries: readonly KeptEntry[]): RoundPlanting | undefined {
  const start = entries.find((entry) => entry.kind === 'spot-count.start' && entry.thingId === plantingId);
  if (!start) return undefined;
  const body = start.body as { field: { id: string }; plantedOn: string; crop: RoundPlanting['crop']; rowSpacing: Typed; seedingRate: Typed };
  return {
    id: plantingId,
    fieldId: body.field.id,
    plantedOn: body.plantedOn,
    plantedAt: null,
    crop: body.crop,
    rowSpacingInches: inUnit(body.rowSpacing, 'in', 'in').amount,
    seedsPerAcre: inUnit(body.seedingRate, 'per-acre', 'per-acre').amount,
    hasTrial: false,
    strips: [],
    transects: [],
    conditions: [],
    notes: [],
    rows: [],
  };
}

function placeBegunHere(entry: KeptEntry, planting: RoundPlanting): RoundRow {
  const { label, length, startEnd, farEnd } = entry.body as { label: string; length: Typed; startEnd: RoundRow['startEnd']; farEnd: RoundRow['farEnd'] };
  const { reading, amount } = inUnit(length, 'ft', 'in');
  return {
    id: entry.thingId,
    label,
    stripId: null,
    stripNumber: null,
    blockNumber: null,
    zoneName: null,
    planterRow: null,
    length: { typed: length.typed, unit: reading?.unit ?? 'ft', inches: amount },
    startEnd,
    farEnd,
    seeds: amount > 0 && planting.rowSpacingInches > 0 ? planting.seedsPerAcre * rowAreaAcres(amount, planting.rowSpacingInches) : 0,
    counts: [],
    tapeSheets: [],
    depths: [],
    cover: [],
    digs: [],
    crusts: [],
    markers: [],
  };
}

/** The field of a spot count that was begun on this phone, until a day holds it. */
export function fieldBegunHere(fieldId: string, entries: readonly KeptEntry[]): RoundField {
  const start = entries.find((entry) => entry.kind === 'spot-count.start');
  const body = start?.body as { farmId: string; field: { name: string | null } } | undefined;
  return { id: fieldId, farmId: body?.farmId ?? '', name: body?.field.name ?? '', restrictions: [] };
}
