import type { RoundField, RoundRestriction } from '@/lib/schemas/round-day';
import type { KeptEntry } from './entry';

/** A field with the sprayings, corrections and exceptions that this phone kept since the day was taken along. */
export function mergeField(field: RoundField, entries: readonly KeptEntry[], me: { id: string; name: string }): RoundField {
  const standing = entries.filter((entry) => entry.state !== 'needs-look');
  const made = standing
    .filter((entry) => entry.kind === 'entry-restriction.record' && entry.body.fieldId === field.id && !field.restrictions.some((each) => each.id === entry.thingId))
    .map((entry): RoundRestriction => ({ ...(entry.body as Pick<RoundRestriction, 'product' | 'endedOn' | 'endedAt' | 'hours'>), id: entry.thingId, personName: me.name, exceptions: [] }));
  const replaced = new Set(standing.map((entry) => entry.body.replacesId).filter((id) => typeof id === 'string'));
  const exceptions = standing.filter((entry) => entry.kind === 'entry-exception.record');
  return {
    ...field,
    restrictions: [...field.restrictions, ...made]
      .filter((restriction) => !replaced.has(restriction.id))
      .map((restriction) => ({
        ...restriction,
        exceptions: [
          ...restriction.exceptions,
          ...exceptions
            .filter((entry) => entry.body.restrictionId === restriction.id && !restriction.exceptions.some((each) => each.id === entry.thingId))
            .map((entry) => ({ ...(entry.body as { enteredOn: string; exception: string; equipment: string }), id: entry.thingId, personId: me.id })),
        ],
      })),
  };
}
