import { ImpossibleInput } from './outcome';

/** A stream of chance that is the same on every machine for the same seed. It carries state: make one, use it, drop it. */
export type RandomStream = {
  /** The next whole number from 0 to 4,294,967,295, each equally likely. */
  nextWord: () => number;
  /** The next number from 0 up to but not including 1, in steps of 2⁻⁵³. */
  nextUnit: () => number;
  /** The next whole number from 0 to `limit` − 1, each equally likely. */
  nextBelow: (limit: number) => number;
};

/** Seeds are whole numbers in this range, so that one can be printed, read out and typed in again. */
export const SEED_MAX = 0xffffffff;

const WORDS = 0x100000000;

/**
 * Which chance numbers belong to a seed?
 *
 * Inputs: `seed`, a whole number from 0 to 4,294,967,295. Result: a stream of numbers.
 * Throws ImpossibleInput for any other seed.
 * Method: xoshiro128**, Blackman & Vigna 2021, ACM Transactions on Mathematical Software 47:36, its four words
 * of state filled from the seed by the 32-bit finaliser of MurmurHash3 over a Weyl sequence. Whole numbers below
 * a limit are drawn by rejection, because the remainder of a division favours the small ones.
 * What it is not: fit for secrets. It shuffles strips and draws simulations that anyone may repeat.
 * Example: two streams of seed 7 give the same numbers; seeds 7 and 8 do not.
 */
export function randomStream(seed: number): RandomStream {
  if (!Number.isInteger(seed) || seed < 0 || seed > SEED_MAX) {
    throw new ImpossibleInput(`A seed is a whole number from 0 to ${SEED_MAX}.`, 'seed');
  }
  return randomStreamFromState([0, 1, 2, 3].map((index) => scrambled(seed, index)));
}

/** The generator itself on its four words of state, apart so that it can be held against its authors' numbers. */
export function randomStreamFromState(words: readonly number[]): RandomStream {
  let [a = 0, b = 0, c = 0, d = 0] = words;
  const nextWord = (): number => {
    const result = Math.imul(rotated(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = rotated(d, 11);
    return result;
  };
  return {
    nextWord,
    nextUnit: () => {
      const high = nextWord() >>> 5;
      const low = nextWord() >>> 6;
      return (high * 0x4000000 + low) / 0x20000000000000;
    },
    nextBelow: (limit) => {
      if (!Number.isInteger(limit) || limit < 1 || limit > WORDS) {
        throw new ImpossibleInput('A limit is a whole number of at least 1.', 'limit');
      }
      const firstRejected = WORDS - remainder(WORDS, limit);
      let word = nextWord();
      while (word >= firstRejected) word = nextWord();
      return remainder(word, limit);
    },
  };
}

/**
 * In which order do these things stand after a fair shuffle?
 *
 * Inputs: the things, and a stream. Result: a new array, every order equally likely; the given one is left alone.
 * Method: Durstenfeld 1964, Algorithm 235, Communications of the ACM 7:420.
 */
export function shuffled<T>(things: readonly T[], stream: RandomStream): T[] {
  const result = [...things];
  for (let last = result.length - 1; last > 0; last -= 1) {
    const chosen = stream.nextBelow(last + 1);
    const kept = result[last] as T;
    result[last] = result[chosen] as T;
    result[chosen] = kept;
  }
  return result;
}

/** Exact for whole numbers up to 2³², and much faster than % where they do not fit 31 bits. */
function remainder(word: number, limit: number): number {
  return word - Math.floor(word / limit) * limit;
}

function rotated(word: number, bits: number): number {
  return (word << bits) | (word >>> (32 - bits));
}

function scrambled(seed: number, index: number): number {
  let word = (seed + Math.imul(index + 1, 0x9e3779b9)) | 0;
  word = Math.imul(word ^ (word >>> 16), 0x85ebca6b);
  word = Math.imul(word ^ (word >>> 13), 0xc2b2ae35);
  return word ^ (word >>> 16);
}
