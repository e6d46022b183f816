import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { laidOnce, type TapeLaid } from '@/lib/schemas/tape-laid';
import { tapePositions } from '@/lib/schemas/tape-positions';

const laid = (more: Partial<TapeLaid> = {}): TapeLaid => ({ ...laidOnce, ...more });
const positions = (inches: readonly number[], how: TapeLaid, length: number) => tapePositions(inches, how, length).map((place) => place.positionInches);

describe('places read off a tape', () => {
  it('lie where the tape says, read from the start', () => {
    expect(tapePositions([3, 9.5], laid(), 100)).toEqual([
      { order: 0, segment: 0, positionInches: 3 },
      { order: 1, segment: 0, positionInches: 9.5 },
    ]);
  });

  it('are turned around where they were read from the far end', () => {
    expect(tapePositions([10, 30], laid({ readFrom: 'far-end' }), 100)).toEqual([
      { order: 1, segment: 0, positionInches: 70 },
      { order: 0, segment: 0, positionInches: 90 },
    ]);
  });

  it('never lie before the start, however far the tape went on', () => {
    expect(positions([10, 104], laid({ readFrom: 'far-end' }), 100)).toEqual([0, 94]);
  });

  it('of a cut row share what is left of the length between the cuts and the end', () => {
    // 20 + 30 of 100 in were measured, 50 are left: 25 at the cut, 25 behind the last plant.
    expect(positions([5, 20, 10, 30], laid({ segmentStarts: [2] }), 100)).toEqual([5, 20, 55, 75]);
  });

  it('of a cut row read from the far end begin at the start with the piece read last', () => {
    expect(tapePositions([5, 20, 10, 30], laid({ segmentStarts: [2], readFrom: 'far-end' }), 100).map(({ order, segment, positionInches }) => [order, segment, positionInches])).toEqual([
      [3, 0, 25],
      [2, 0, 45],
      [1, 1, 80],
      [0, 1, 95],
    ]);
  });

  it('ascend, and keep the distances within a piece, whichever way they were read', () => {
    fc.assert(
      fc.property(fc.array(fc.array(fc.integer({ min: 0, max: 400 }), { minLength: 1, maxLength: 8 }), { minLength: 1, maxLength: 4 }), fc.constantFrom('start' as const, 'far-end' as const), (pieces, readFrom) => {
        const read = pieces.map((piece) => piece.map((half) => half / 2).sort((a, b) => a - b));
        const segmentStarts = read.slice(1).map((_, index) => read.slice(0, index + 1).flat().length);
        const places = tapePositions(read.flat(), { readFrom, zeroAt: 'mark', segmentStarts }, 209);
        places.slice(1).forEach((place, index) => expect(place.positionInches).toBeGreaterThanOrEqual(places[index]?.positionInches ?? 0));
        expect(places.every((place) => place.positionInches >= 0)).toBe(true);
        const inRow = read.map((_, piece) => places.filter((place) => place.segment === (readFrom === 'start' ? piece : read.length - 1 - piece)).map((place) => place.positionInches));
        const distances = (inches: readonly number[]) => inches.slice(1).map((each, index) => each - (inches[index] ?? 0));
        read.forEach((piece, index) => {
          const expected = readFrom === 'start' ? distances(piece) : distances(piece).reverse();
          distances(inRow[index] ?? []).forEach((distance, at) => expect(distance).toBeCloseTo(expected[at] ?? Number.NaN, 9));
        });
      }),
    );
  });
});
