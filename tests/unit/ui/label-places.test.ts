import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeLabels } from '@/components/ui/place-labels';
import { spreadLabels } from '@/components/ui/spread-labels';

describe('labels spread along a line', () => {
  it('moves two that overlap apart by the same distance', () => {
    expect(spreadLabels([10, 11], [4, 4], 0, 100)).toEqual([8.5, 12.5]);
  });

  it('leaves labels that stand apart where they are', () => {
    expect(spreadLabels([50, 10, 90], [4, 4, 4], 0, 100)).toEqual([50, 10, 90]);
  });

  it('never lets two overlap, keeps their order, and stays inside where all fit', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.record({ wish: fc.integer({ min: 0, max: 600 }), size: fc.integer({ min: 4, max: 50 }) }),
          {
            maxLength: 12,
          },
        ),
        (labels) => {
          const wishes = labels.map((label) => label.wish);
          const sizes = labels.map((label) => label.size);
          const places = spreadLabels(wishes, sizes, 0, 600);
          const order = wishes.map((_, i) => i).sort((a, b) => (wishes[a] ?? 0) - (wishes[b] ?? 0));
          order.slice(1).forEach((index, rank) => {
            const before = order[rank] ?? 0;
            const least = ((sizes[index] ?? 0) + (sizes[before] ?? 0)) / 2;
            expect((places[index] ?? 0) - (places[before] ?? 0)).toBeGreaterThanOrEqual(least - 1e-6);
          });
          places.forEach((place, index) => {
            expect(place - (sizes[index] ?? 0) / 2).toBeGreaterThanOrEqual(-1e-6);
            expect(place + (sizes[index] ?? 0) / 2).toBeLessThanOrEqual(600 + 1e-6);
          });
        },
      ),
    );
  });
});

describe('labels placed beside each other', () => {
  it('leaves one out rather than let it touch another or leave the picture', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.record({ center: fc.integer({ min: 0, max: 390 }), width: fc.integer({ min: 10, max: 70 }) }),
        ),
        (wishes) => {
          const places = placeLabels(wishes, 0, 390, 6, 26);
          const placed = places
            .flatMap((at, index) => (at === null ? [] : [{ at, width: wishes[index]?.width ?? 0 }]))
            .sort((a, b) => a.at - b.at);
          placed.forEach((label, index) => {
            expect(label.at - label.width / 2).toBeGreaterThanOrEqual(-1e-6);
            expect(label.at + label.width / 2).toBeLessThanOrEqual(390 + 1e-6);
            const next = placed[index + 1];
            if (next)
              expect(next.at - label.at).toBeGreaterThanOrEqual((next.width + label.width) / 2 + 6 - 1e-6);
          });
        },
      ),
    );
  });

  it('gives the first wish its place', () => {
    expect(placeLabels([{ center: 50, width: 20 }], 0, 100, 6, 26)).toEqual([50]);
  });
});
