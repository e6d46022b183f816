import type { TapeUnit } from './vocabulary';

const fraction = /^\d+\/\d+$/;

/**
 * Takes a line of readings apart, as it is read out or copied: "0 2 17 33 38". Line ends, semicolons and tabs part them
 * where there are any; otherwise spaces do, a fraction staying with the whole number before it. On a tape of feet and
 * inches, where a reading holds spaces itself, a comma before a space parts them too.
 */
export function splitTapeReadings(text: string, unit: TapeUnit): string[] {
  const parted = /[\n;\t]/.test(text) ? text.split(/[\n;\t]/) : /,\s/.test(text) ? text.split(/,\s+/) : undefined;
  if (parted) return parted.map((each) => each.trim()).filter((each) => each !== '');
  const words = text.trim().split(/\s+/).filter((each) => each !== '');
  if (unit === 'ft-in' && words.some((word) => /^(ft|feet|foot|in|inch|inches)\.?$/i.test(word))) return feetAndInches(words);
  return words.reduce<string[]>((readings, word) => {
    const before = readings.at(-1);
    if (fraction.test(word) && before !== undefined && /^(\d+|\d+'\d+)$/.test(before)) return [...readings.slice(0, -1), `${before} ${word}`];
    return [...readings, word];
  }, []);
}

/** "5 ft 3 in 5 ft 9 6 ft": a number before "ft" opens the next reading. */
function feetAndInches(words: readonly string[]): string[] {
  const readings: string[][] = [];
  words.forEach((word, index) => {
    const opens = /^\d+$/.test(word) && /^(ft|feet|foot)\.?$/i.test(words[index + 1] ?? '');
    if (opens || readings.length === 0) readings.push([word]);
    else readings.at(-1)?.push(word);
  });
  return readings.map((each) => each.join(' '));
}
