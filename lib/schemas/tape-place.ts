import { plainTyping } from './plain-typing';
import type { TapeUnit } from './vocabulary';

/** A place on the tape as it is kept: thousandths of an inch, or of a centimeter where the tape is in centimeters. */
export type ParsedTapePlace = { ok: true; thousandths: number } | { ok: false; message: string };

const examples: Record<TapeUnit, string> = { in: '68 or 68 1/2', 'ft-in': "5 ft 8 or 5'8 1/2", 'ft-tenths': '5.7', cm: '172.5' };
const inchesPerFoot = 12;
const centimetersPerInch = 2.54;
/** 1,000 feet, the longest row that can be sampled. */
const inchesMost = 12_000;

/** One number as people write it on paper: 68, 68.5, 68,5, 68 1/2. Undefined for what is none, or could be two. */
function numberOf(text: string): number | undefined {
  const plain = text.trim();
  const fraction = /^(?:(\d+)\s+)?(\d+)\/(\d+)$/.exec(plain);
  if (fraction) {
    const [, whole = '0', top, bottom] = fraction;
    // A fraction of one or more, such as 5/2 or 1 5/4, is a slip of the pen.
    return Number(top) < Number(bottom) ? Number(whole) + Number(top) / Number(bottom) : undefined;
  }
  // 1,200 could be twelve hundred or one and a fifth.
  if (/^\d{1,3},\d{3}$/.test(plain)) return undefined;
  return /^(\d+([.,]\d+)?|[.,]\d+)$/.test(plain) ? Number(plain.replace(',', '.')) : undefined;
}

type Read = { in: 'inches' | 'centimeters'; amount: number } | undefined;

const inches = (amount: number | undefined): Read => (amount === undefined ? undefined : { in: 'inches', amount });

function feetAndInches(feet: string, rest: string | undefined): Read {
  const over = rest === undefined ? 0 : numberOf(rest);
  return over === undefined || over >= inchesPerFoot ? undefined : inches(Number(feet) * inchesPerFoot + over);
}

/** A place that says its own unit. */
function withUnit(text: string): Read {
  const feet = /^(\d+)\s*(?:ft\.?|feet|foot|')\s*(?:([\d.,].*?)\s*(?:in\.?|inch|inches|")?)?$/i.exec(text);
  if (feet) return feetAndInches(feet[1] ?? '', feet[2]);
  const suffixed = /^(.+?)\s*(ft\.?|feet|foot|'|in\.?|inch|inches|"|cm\.?)$/i.exec(text);
  const amount = suffixed ? numberOf(suffixed[1] ?? '') : undefined;
  if (amount === undefined) return undefined;
  const unit = (suffixed?.[2] ?? '').toLowerCase();
  if (unit.startsWith('cm')) return { in: 'centimeters', amount };
  return inches(unit === "'" || unit.startsWith('f') ? amount * inchesPerFoot : amount);
}

/** A bare number, read as the tape in hand says it. */
function bare(text: string, unit: TapeUnit): Read {
  if (unit === 'ft-in') {
    const both = /^(\d+)(?:\s+|\s*-\s*)(\d+(?:[.,]\d+)?(?:\s+\d+\/\d+)?)$/.exec(text);
    if (both) return feetAndInches(both[1] ?? '', both[2]);
    // A whole number alone is that many feet; 5.5 or 5 1/2 could be feet or inches and is asked for again.
    return /^\d+$/.test(text) ? inches(Number(text) * inchesPerFoot) : undefined;
  }
  const amount = numberOf(text);
  if (amount === undefined) return undefined;
  if (unit === 'cm') return { in: 'centimeters', amount };
  return inches(unit === 'ft-tenths' ? amount * inchesPerFoot : amount);
}

/** Reads one place by the tape in hand. The text as typed is stored beside the number by whoever keeps it. */
export function parseTapePlace(typed: string, unit: TapeUnit): ParsedTapePlace {
  const text = plainTyping(typed);
  const read = withUnit(text) ?? bare(text, unit);
  if (read === undefined) return { ok: false, message: `Write the place as the tape says it, such as ${examples[unit]}.` };
  if ((read.in === 'centimeters') !== (unit === 'cm')) {
    return { ok: false, message: unit === 'cm' ? 'This tape is in centimeters; the place is in feet or inches.' : 'This place is in centimeters; the tape is not.' };
  }
  const inchesRead = read.in === 'centimeters' ? read.amount / centimetersPerInch : read.amount;
  if (inchesRead > inchesMost) return { ok: false, message: 'This place is farther than any tape reaches.' };
  return { ok: true, thousandths: Math.round(read.amount * 1000) };
}

/** The place in inches, whichever tape it was read on. */
export const placeInches = (thousandths: number, unit: TapeUnit) => thousandths / 1000 / (unit === 'cm' ? centimetersPerInch : 1);
