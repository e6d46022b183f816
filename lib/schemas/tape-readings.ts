import { parseTapePlace } from './tape-place';
import type { TapeUnit } from './vocabulary';

/**
 * Takes a line of readings apart, as it is read out or copied: "0 2 17 33 38". Line ends, semicolons, tabs and a comma
 * before a space part them; what is left between is one reading where the tape can be read so, and otherwise parted at its
 * spaces, a fraction staying with the whole number before it.
 */
export function splitTapeReadings(text: string, unit: TapeUnit): string[] {
  return text
    .split(/[\n\r;\t]|,\s/)
    .map((piece) => piece.trim())
    .filter((piece) => piece !== '')
    .flatMap((piece) => (parseTapePlace(piece, unit).ok ? [piece] : partedAtSpaces(piece)));
}

const fraction = /^\d+\/\d+$/;
const takesFraction = /^(\d+|\d+'\d+)$/;
const feetWord = /^(ft|feet|foot)\.?$/i;

function partedAtSpaces(piece: string): string[] {
  const words = piece.split(/\s+/);
  if (words.some((word) => feetWord.test(word))) return feetAndInches(words);
  const readings: string[] = [];
  for (const word of words) {
    const before = readings.at(-1);
    if (before !== undefined && fraction.test(word) && takesFraction.test(before)) readings[readings.length - 1] = `${before} ${word}`;
    else readings.push(word);
  }
  return readings;
}

/** "5 ft 3 in 5 ft 9 6 ft": a number before "ft" opens the next reading. */
function feetAndInches(words: readonly string[]): string[] {
  const readings: string[][] = [];
  words.forEach((word, index) => {
    const opens = /^\d+$/.test(word) && feetWord.test(words[index + 1] ?? '');
    if (opens || readings.length === 0) readings.push([word]);
    else readings.at(-1)?.push(word);
  });
  return readings.map((each) => each.join(' '));
}
