import { readingUnitText } from '@/lib/format/reading-unit-text';
import { plainTyping } from './plain-typing';
import type { ReadingUnit } from './vocabulary';

/** A reading as it is kept: what was typed, its unit, and the number as whole thousandths of that unit. */
export type Reading = { typed: string; unit: ReadingUnit; thousandths: number };

export type ReadingRule = {
  /** The unit that holds when none is typed. */
  unit: ReadingUnit;
  /** Other units that may be typed after the number. */
  otherUnits?: readonly ReadingUnit[];
  /** In the default unit; a limit for another unit follows by conversion. */
  least: number;
  most: number;
  /** Whether "34,000" means thirty-four thousand; for lengths a comma is a decimal comma. */
  thousandsComma?: boolean;
  /** Said in errors: "row spacing". */
  name: string;
};

export type ParsedReading = { ok: true; reading: Reading } | { ok: false; message: string };

const spellings: Record<string, ReadingUnit> = {
  in: 'in', inch: 'in', inches: 'in', '"': 'in', ft: 'ft', foot: 'ft', feet: 'ft', "'": 'ft',
  cm: 'cm', m: 'm', mm: 'mm', ac: 'acres', acre: 'acres', acres: 'acres', ha: 'ha',
  '/ac': 'per-acre', 'per acre': 'per-acre', '/ha': 'per-ha', 'per ha': 'per-ha', '%': 'percent', percent: 'percent',
  'bu/ac': 'bu/ac', bu: 'bu/ac', 't/ha': 't/ha', lb: 'lb', lbs: 'lb', kg: 'kg', lbf: 'lbf', psi: 'psi', kpa: 'kPa', n: 'N',
};

/** How many of the second unit one of the first holds; used for limits and for figures, never to change what is kept. */
const perCanonical: Record<ReadingUnit, { of: string; factor: number }> = {
  in: { of: 'length', factor: 1 }, ft: { of: 'length', factor: 12 }, cm: { of: 'length', factor: 1 / 2.54 },
  m: { of: 'length', factor: 100 / 2.54 }, mm: { of: 'length', factor: 1 / 25.4 },
  acres: { of: 'area', factor: 1 }, ha: { of: 'area', factor: 2.47105381 },
  'per-acre': { of: 'density', factor: 1 }, 'per-ha': { of: 'density', factor: 1 / 2.47105381 },
  percent: { of: 'share', factor: 1 },
  // 1 Mg/ha of corn is 15.93 bu/ac (56 lb a bushel).
  'bu/ac': { of: 'yield', factor: 1 }, 't/ha': { of: 'yield', factor: 15.93 },
  lb: { of: 'weight', factor: 1 }, kg: { of: 'weight', factor: 2.20462262 },
  lbf: { of: 'force', factor: 1 }, N: { of: 'force', factor: 0.224808943 },
  psi: { of: 'pressure', factor: 1 }, kPa: { of: 'pressure', factor: 0.145037738 },
};

/** Whether two units measure the same thing. A force and a pressure do not, though a planter's cab shows either. */
export const sameQuantity = (one: ReadingUnit, other: ReadingUnit) => perCanonical[one].of === perCanonical[other].of;

/** A reading in another unit of the same quantity. Throws where the two measure different things. */
export function readingIn(reading: { unit: ReadingUnit; thousandths: number }, unit: ReadingUnit): number {
  // There and back again would cost the last digit, and with it a value that lies on its limit.
  if (reading.unit === unit) return reading.thousandths / 1000;
  const from = perCanonical[reading.unit];
  const to = perCanonical[unit];
  if (from.of !== to.of) throw new RangeError(`${reading.unit} cannot be read as ${unit}`);
  return ((reading.thousandths / 1000) * from.factor) / to.factor;
}

const feetInches = /^(\d+)\s*(?:ft|feet|foot|')\s*(?:(\S.*?)\s*(?:in|inch|inches|")?)?$/i;
// A slash belongs to the number only before a digit, as in 5 1/4; in 84,000/ha it begins the unit.
const numberAndUnit = /^([-+]?(?:[\d.,\s]|\/(?=\d))+)\s*([^\d\s.,].*)?$/;

type TypedNumber = number | 'two-ways' | undefined;

/** One number as people write it: 17.5, 17,5, 5 1/4, 34,000. Undefined where it is none; 'two-ways' where it could be two. */
function numberOf(text: string, thousandsComma: boolean): TypedNumber {
  const rest = text.trim();
  const fraction = /^(-)?(?:(\d+)\s+)?(\d+)\/(\d+)$/.exec(rest);
  if (fraction) {
    const [, minus, whole, top, bottom] = fraction;
    // 5 5/4 is a slip of the pen.
    if (Number(bottom) === 0 || (whole !== undefined && Number(top) >= Number(bottom))) return undefined;
    return (minus ? -1 : 1) * (Number(whole ?? 0) + Number(top) / Number(bottom));
  }
  if (thousandsComma && /^[-+]?\d{1,3}([, ]\d{3})+(\.\d+)?$/.test(rest)) return Number(rest.replace(/[, ]/g, ''));
  // A comma before three digits could be read two ways where lengths are typed, so it is asked about instead of guessed.
  if (/^[-+]?\d{1,3},\d{3}$/.test(rest)) return 'two-ways';
  return /^[-+]?(\d+([.,]\d+)?|[.,]\d+)$/.test(rest) ? Number(rest.replace(',', '.')) : undefined;
}

const typedMost = 40;

/** The one parser of everything that is measured. Keeps the text as typed and says in a sentence what is wrong. */
export function parseReading(text: string, rule: ReadingRule): ParsedReading {
  const typed = text.trim();
  const example = exampleOf(rule);
  const wrong = (message: string): ParsedReading => ({ ok: false, message });
  if (typed === '') return wrong(`Type the ${rule.name}.`);
  if (typed.length > typedMost) return wrong(`That is too long for a ${rule.name}. Write it such as ${example}.`);
  const allowed = [rule.unit, ...(rule.otherUnits ?? [])];
  const parts = splitReading(plainTyping(typed), rule, allowed);
  if (!parts) return wrong(`Write the ${rule.name} as a number such as ${example}.`);
  if (!allowed.includes(parts.unit)) return wrong(`The ${rule.name} is given in ${allowed.map(readingUnitText).join(' or ')}.`);
  if (parts.value === 'two-ways') {
    return wrong(`"${typed}" can be read two ways. Write it without the comma, or with a point for the decimals.`);
  }
  if (parts.value < 0) return wrong(`The ${rule.name} cannot be below zero.`);
  const thousandths = Math.round(parts.value * 1000);
  // Where the unit measures something else than the rule's own, the limits hold as plain numbers.
  const shown = sameQuantity(parts.unit, rule.unit) ? rule.unit : parts.unit;
  const value = readingIn({ unit: parts.unit, thousandths }, shown);
  if (value < rule.least || value > rule.most) {
    return wrong(`The ${rule.name} is expected between ${limitText(rule.least)} and ${limitText(rule.most)} ${readingUnitText(shown)}; this says ${typed}.`);
  }
  return { ok: true, reading: { typed, unit: parts.unit, thousandths } };
}

const limitText = (limit: number) => limit.toLocaleString('en-US', { maximumFractionDigits: 3 });

function exampleOf(rule: ReadingRule): string {
  const examples: Partial<Record<ReadingUnit, string>> = {
    in: '30 or 5 1/4', ft: '17 ft 5 in', cm: '76', m: '5.31', 'per-acre': '34,000', 'per-ha': '84,000', percent: '95',
    acres: '62.5', ha: '25', 'bu/ac': '200', 't/ha': '12.5',
  };
  return examples[rule.unit] ?? '12.5';
}

function splitReading(
  text: string,
  rule: ReadingRule,
  allowed: readonly ReadingUnit[],
): { value: number | 'two-ways'; unit: ReadingUnit } | undefined {
  const mixed = allowed.includes('ft') || allowed.includes('in') ? feetInches.exec(text) : null;
  if (mixed) {
    const inches = mixed[2] === undefined ? 0 : numberOf(mixed[2], false);
    if (inches === undefined || inches === 'two-ways' || inches < 0 || inches >= 12) return undefined;
    return { value: Number(mixed[1]) * 12 + inches, unit: 'in' };
  }
  const simple = numberAndUnit.exec(text);
  if (!simple) return undefined;
  const value = numberOf(simple[1] ?? '', rule.thousandsComma ?? false);
  const unit = simple[2] === undefined ? rule.unit : spellings[simple[2].trim().toLowerCase().replace(/\.$/, '')];
  return value === undefined || unit === undefined ? undefined : { value, unit };
}
