import fc from 'fast-check';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { TapeRow } from '@/components/tape/tape-row';
import type { TapePlant } from '@/components/tape/tape-plant';

const draw = (plants: TapePlant[], orientation: 'horizontal' | 'upright', units: 'us' | 'metric' = 'us') =>
  renderToStaticMarkup(
    <TapeRow
      lengthInches={209}
      plants={plants}
      units={units}
      startEnd="mark"
      farEnd="mark"
      orientation={orientation}
      label="Strip 7, row 2"
    />,
  );

const plants = fc.array(
  fc.record<TapePlant>({
    positionInches: fc.integer({ min: 0, max: 418 }).map((half) => half / 2),
    earliness: fc.option(fc.double({ min: 0, max: 1, noNaN: true })),
    late: fc.boolean(),
    double: fc.boolean(),
    kind: fc.constantFrom('plant', 'plant', 'plant', 'missing'),
  }),
  { maxLength: 45 },
);

describe('a row on the tape', () => {
  it('tells who cannot see it what stands there', () => {
    const markup = draw(
      [
        { positionInches: 4, earliness: 1, late: false, double: false, kind: 'plant' },
        { positionInches: 12, earliness: 0, late: true, double: false, kind: 'plant' },
        { positionInches: 18, earliness: null, late: false, double: false, kind: 'missing' },
      ],
      'upright',
    );
    expect(markup).toContain('<title');
    expect(markup).toContain('Strip 7, row 2');
    expect(markup).toContain('2 plants in 17 ft 5 in of row, of which 1 late; 0 doubles; 1 seed never came.');
  });

  it('is drawn for any row, also an empty one, in both directions and units', () => {
    fc.assert(
      fc.property(plants, (row) => {
        for (const orientation of ['horizontal', 'upright'] as const)
          for (const units of ['us', 'metric'] as const) {
            const markup = draw(row, orientation, units);
            expect(markup).not.toMatch(/NaN|undefined|Infinity/);
          }
      }),
      { numRuns: 40 },
    );
  });

  it('writes every place beside an upright tape, no two closer than a line', () => {
    fc.assert(
      fc.property(plants, (row) => {
        const ys = [...draw(row, 'upright').matchAll(/<text x="62" y="([\d.-]+)"/g)].map((match) =>
          Number(match[1]),
        );
        expect(ys).toHaveLength(row.filter((one) => one.kind === 'plant').length);
        ys.sort((a, b) => a - b).forEach((y, index) => {
          const next = ys[index + 1];
          // 15 units apart, written to a tenth.
          if (next !== undefined) expect(next - y).toBeGreaterThanOrEqual(14.8);
        });
      }),
      { numRuns: 60 },
    );
  });
});
