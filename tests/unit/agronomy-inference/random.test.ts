import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { randomStream, randomStreamFromState, shuffled } from '../../../lib/agronomy/random';

describe('randomStream', () => {
  it('gives the numbers of the generator it names', () => {
    // State 1 2 3 4. Source: rust-random/rngs, rand_xoshiro/src/xoshiro128starstar.rs, made there with the authors' C program, v1.1.
    const stream = randomStreamFromState([1, 2, 3, 4]);
    const words = Array.from({ length: 10 }, () => stream.nextWord());
    expect(words).toEqual([
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
    ]);
  });

  it('repeats itself for the same seed and differs for the next', () => {
    const first = Array.from(
      { length: 5 },
      (
        (stream) => () =>
          stream.nextWord()
      )(randomStream(7)),
    );
    const again = Array.from(
      { length: 5 },
      (
        (stream) => () =>
          stream.nextWord()
      )(randomStream(7)),
    );
    const other = Array.from(
      { length: 5 },
      (
        (stream) => () =>
          stream.nextWord()
      )(randomStream(8)),
    );
    expect(again).toEqual(first);
    expect(other).not.toEqual(first);
  });

  it('stays within its ranges', () => {
    const stream = randomStream(0);
    for (let draw = 0; draw < 10_000; draw += 1) {
      const unit = stream.nextUnit();
      expect(unit >= 0 && unit < 1).toBe(true);
      expect([0, 1, 2]).toContain(stream.nextBelow(3));
    }
  });

  it('does not favor small numbers when the limit does not divide its range', () => {
    // With the limit at three quarters of the range, plain remainders would put half the draws into the first third.
    const stream = randomStream(3);
    let inFirstThird = 0;
    for (let draw = 0; draw < 10_000; draw += 1)
      if (stream.nextBelow(3 * 2 ** 30) < 2 ** 30) inFirstThird += 1;
    // Four standard errors of 10,000 draws at a third are 1.9 points.
    expect(Math.abs(inFirstThird / 10_000 - 1 / 3)).toBeLessThan(0.019);
  });

  it.each([-1, 1.5, Number.NaN, 4_294_967_296])('refuses the seed %s', (seed) => {
    expect(() => randomStream(seed)).toThrow(ImpossibleInput);
  });
});

describe('nextBelow', () => {
  it.each([0, -1, 2.5, Number.NaN, 4_294_967_297])('refuses %d as a limit', (limit) => {
    expect(() => randomStream(1).nextBelow(limit)).toThrow(ImpossibleInput);
  });

  it('is the remainder of the next word, for any limit', () => {
    fc.assert(
      fc.property(
        fc.nat({ max: 4_294_967_295 }),
        fc.integer({ min: 1, max: 4_294_967_296 }),
        (seed, limit) => {
          const word = randomStream(seed).nextWord();
          // Words past the last whole multiple of the limit are drawn again.
          fc.pre(word < 4_294_967_296 - (4_294_967_296 % limit));
          expect(randomStream(seed).nextBelow(limit)).toBe(word % limit);
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe('shuffled', () => {
  it('gives every order of four things equally often', () => {
    const stream = randomStream(2024);
    const counts = new Map<string, number>();
    for (let draw = 0; draw < 24_000; draw += 1) {
      const order = shuffled(['a', 'b', 'c', 'd'], stream).join('');
      counts.set(order, (counts.get(order) ?? 0) + 1);
    }
    expect(counts.size).toBe(24);
    const chiSquare = [...counts.values()].reduce((sum, count) => sum + (count - 1000) ** 2 / 1000, 0);
    // The 99.9 % point of chi-square on 23 degrees of freedom is 49.73 (printed tables).
    expect(chiSquare).toBeLessThan(49.73);
  });

  it('leaves what it was given alone', () => {
    const given = Object.freeze(['a', 'b', 'c']);
    expect([...shuffled(given, randomStream(1))].sort()).toEqual(['a', 'b', 'c']);
    expect(given).toEqual(['a', 'b', 'c']);
  });
});
