import type { TapeUnit } from './vocabulary';

/** A place on the tape as it is kept: thousandths of an inch, or of a centimetre where the tape is in centimetres. */
export type ParsedTapePlace = { ok: true; thousandths: number } | { ok: false; message: string };

const examples: Record<TapeUnit, string> = { in: '68 or 68 1/2', 'ft-in': '5 ft 8 or 5\'8 1/2', 'ft-tenths': '5.7', cm: '172.5' };

function numberOf(text: string): number | undefined {
  const glyphs: Record<string, string> = { '½': ' 1/2', '¼': ' 1/4', '¾': ' 3/4' };
  const plain = text.replace(/[½¼¾]/g, (each) => glyphs[each] ?? '').trim();
  const fraction = /^(?:(\d+)\s+)?(\d+)\/(\d+)$/.exec(plain);
  if (fraction) {
    return Number(fraction[3]) === 0 ? undefined : Number(fraction[1] ?? 0) + Number(fraction[2]) / Number(fraction[3]);
  }
  return /^(\d+([.,]\d+)?|[.,]\d+)$/.test(plain) ? Number(plain.replace(',', '.')) : undefined;
}

function inchesOf(text: string, unit: TapeUnit): number | undefined {
  const mixed = /^(\d+)\s*(?:ft|feet|foot|'|′|-|\s)\s*(?:(\S.*?)\s*(?:in|inch|inches|"|″)?)?$/i.exec(text);
  if (unit === 'ft-in' || /ft|feet|foot|'|′/i.test(text)) {
    if (mixed) {
      const inches = mixed[2] === undefined ? 0 : numberOf(mixed[2]);
      return inches === undefined || inches >= 12 ? undefined : Number(mixed[1]) * 12 + inches;
    }
    // On a tape of feet and inches a bare number is that many feet.
    return /^\d+$/.test(text) ? Number(text) * 12 : undefined;
  }
  const bare = numberOf(text.replace(/\s*(in|inch|inches|"|″|cm)\s*$/i, ''));
  return bare === undefined ? undefined : unit === 'ft-tenths' ? bare * 12 : bare;
}

/** Reads one place by the tape in hand. Keeps nothing by itself: the text as typed is stored beside the number. */
export function parseTapePlace(typed: string, unit: TapeUnit): ParsedTapePlace {
  const text = typed.trim();
  const read = inchesOf(text, unit);
  if (read === undefined || !Number.isFinite(read)) return { ok: false, message: `Write the place as the tape says it, such as ${examples[unit]}.` };
  if (read > 100_000) return { ok: false, message: 'This place is farther than any tape reaches.' };
  return { ok: true, thousandths: Math.round(read * 1000) };
}

/** The place in inches, whichever tape it was read on. */
export const placeInches = (thousandths: number, unit: TapeUnit) => (unit === 'cm' ? thousandths / 2540 : thousandths / 1000);
