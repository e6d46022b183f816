import type { KeptEntry } from '@/lib/client/round/entry';
import type { Round } from '@/lib/client/round/round';
import { keptTexts } from '@/lib/texts/kept-texts';

/** What an entry is and where it belongs, in a few words: "Count, S1-1: 28 up so far". */
export function entryWords(round: Round, entry: KeptEntry): { what: string; where: string; number: string } {
  const planting = entry.plantingId ? round.planting(entry.plantingId) : undefined;
  const row = planting?.planting.rows.find((each) => each.id === entry.rowSampleId);
  return {
    what: keptTexts.kinds[entry.kind] ?? entry.kind,
    where: [row?.label, planting?.field.name].filter(Boolean).join(', '),
    number: numberOf(entry.body),
  };
}

function numberOf(body: Record<string, unknown>): string {
  if (typeof body.plants === 'number') return `${body.countedAs === 'new' ? '+' : ''}${body.plants}`;
  if (Array.isArray(body.places)) return String(body.places.length);
  if (Array.isArray(body.depths)) return String(body.depths.length);
  if (typeof body.marksRead === 'number') return `${String(body.marksCovered)}/${body.marksRead}`;
  if (typeof body.markers === 'number') return String(body.markers);
  return '';
}
