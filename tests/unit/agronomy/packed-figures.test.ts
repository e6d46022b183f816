import { describe, expect, it } from 'vitest';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { emergencePercentile } from '@/lib/agronomy/emergence-percentile';
import { emergenceSpread } from '@/lib/agronomy/emergence-spread';
import { kachmanSmith } from '@/lib/agronomy/kachman-smith';
import { ImpossibleInput, type Outcome } from '@/lib/agronomy/outcome';
import { packedFigures } from '@/lib/agronomy/packed-figures';
import { packRows } from '@/lib/agronomy/pack-rows';
import { packedKnown } from '@/lib/agronomy/packed-rows';
import { randomStream } from '@/lib/agronomy/random';
import { spacingInchesMean, spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';

type PlainRow = { places: number[]; days: number[]; up: number[]; held: number; area: number; theoretical: number };

const plain = (changes: Partial<PlainRow> = {}): PlainRow => ({ places: [0, 6, 13], days: [8, 9, 10], up: [0, 2, 3], held: 3, area: 0.001, theoretical: 6.15, ...changes });

const packed = (rows: readonly PlainRow[]) =>
  packRows(rows.map((row) => ({
    placesInches: row.places,
    visits: row.days.map((days, index) => ({ days, plantsUp: row.up[index] ?? 0 })),
    plantsHeld: row.held,
    areaAcres: row.area,
    theoreticalSpacingInches: row.theoretical,
  })));

const orNothing = (outcome: Outcome<number>) => (outcome.kind === 'value' ? outcome.value : 'insufficient');

/** The same figures by the functions for records. */
function byRecords(row: PlainRow) {
  const spacings = spacingsInches(row.places);
  const variation = spacingVariation(spacings);
  const placement = kachmanSmith([{ spacingsInches: spacings, theoreticalSpacingInches: row.theoretical }]);
  const curve = emergenceCurve(row.days.map((days, index) => ({ days, plantsUp: row.up[index] ?? 0 })));
  const atLatest = (share: number) => {
    const reached = curve.kind === 'value' ? emergencePercentile(curve.value, share) : curve;
    return reached.kind === 'value' && 'bound' in reached.value && reached.value.bound === 'at-latest';
  };
  const daysTo = (share: number) => {
    if (curve.kind === 'insufficient') return 'insufficient';
    const reached = emergencePercentile(curve.value, share);
    return reached.kind === 'value' ? reached.value.days : 'insufficient';
  };
  const spread = curve.kind === 'value' ? emergenceSpread(curve.value) : curve;
  return {
    plantsPerAcre: row.held / row.area,
    spacingInchesMean: orNothing(spacingInchesMean(spacings)),
    spacingInchesSd: variation.kind === 'value' ? variation.value.spacingInchesSd : 'insufficient',
    spacingCv: variation.kind === 'value' ? orNothing(variation.value.spacingCv) : 'insufficient',
    multiplesShare: placement.kind === 'value' ? placement.value.ofSpacings.multiplesShare : 'insufficient',
    singlesShare: placement.kind === 'value' ? placement.value.ofSpacings.singlesShare : 'insufficient',
    missesShare: placement.kind === 'value' ? placement.value.ofSpacings.missesShare : 'insufficient',
    daysTo10: daysTo(0.1),
    daysTo50: daysTo(0.5),
    daysTo90: daysTo(0.9),
    spreadDays: spread.kind === 'value' ? spread.value.days : 'insufficient',
    atLatest: [atLatest(0.1), atLatest(0.5), atLatest(0.9)],
  } as const;
}

const bitOf = {
  plantsPerAcre: 0,
  spacingInchesMean: packedKnown.spacingMean, spacingInchesSd: packedKnown.spacingSd, spacingCv: packedKnown.spacingCv,
  multiplesShare: packedKnown.placement, singlesShare: packedKnown.placement, missesShare: packedKnown.placement,
  daysTo10: packedKnown.days, daysTo50: packedKnown.days, daysTo90: packedKnown.days, spreadDays: packedKnown.spread,
} as const;

function expectAsByRecords(rows: readonly PlainRow[]) {
  const figures = packedFigures(packed(rows));
  rows.forEach((row, index) => {
    const expected = byRecords(row);
    const known = figures.known[index] ?? 0;
    const bounds = [packedKnown.daysTo10AtLatest, packedKnown.daysTo50AtLatest, packedKnown.daysTo90AtLatest].map((bit) => (known & bit) !== 0);
    expect([index, bounds]).toEqual([index, expected.atLatest]);
    for (const name of Object.keys(bitOf) as (keyof typeof bitOf)[]) {
      const isKnown = bitOf[name] === 0 || ((figures.known[index] ?? 0) & bitOf[name]) !== 0;
      const record = expected[name];
      expect([index, name, isKnown]).toEqual([index, name, record !== 'insufficient']);
      if (record !== 'insufficient') expect(figures[name][index]).toBeCloseTo(Number(record), 9);
    }
  });
  return figures;
}

describe('figures of packed row samples', () => {
  it('give the printed figures of the printed tape readings', () => {
    // The worked example printed with the SSMG-37 guide; 10 spaces in 68 in of a 30-inch row.
    const row = plain({ places: [0, 2, 17, 33, 38, 39, 44, 52, 55, 60, 68], held: 10, area: (68 * 30) / 6_272_640 });
    const figures = packedFigures(packed([row]));
    expect(figures.spacingInchesMean[0]).toBeCloseTo(6.8, 9);
    expect(figures.spacingInchesSd[0]).toBeCloseTo(5.116, 3);
    expect(figures.plantsPerAcre[0]).toBeCloseTo(30_748, 0);
  });

  it('equal the figures of records within 1e-9, falling counts, missing sheets and lone plants among them', () => {
    const stream = randomStream(20_260_507);
    const rows = Array.from({ length: 400 }, () => {
      const plants = Math.floor(stream.nextUnit() * 34);
      const places = Array.from({ length: plants }, () => Math.round(stream.nextUnit() * 418) / 2).sort((a, b) => a - b);
      const visits = Math.floor(stream.nextUnit() * 9);
      const up = Array.from({ length: visits }, (_, index) => Math.max(0, Math.round(stream.nextUnit() * 9 + index * 3 - 6)));
      return plain({ places, days: up.map((_, index) => 7 + index + stream.nextUnit() / 2), up, held: plants });
    });
    expect(rows.filter(({ up }) => up.some((plants, index) => plants < (up[index - 1] ?? 0))).length).toBeGreaterThan(50);
    expectAsByRecords(rows);
  });

  it('put a percentile that a visit meets on that visit', () => {
    expectAsByRecords([plain({ up: [1, 5, 10] }), plain({ up: [0, 5, 10] }), plain({ up: [9, 10, 10] }), plain({ up: [5, 9, 10] })]);
  });

  it('put spacings on a limit where the record function puts them', () => {
    expectAsByRecords([plain({ places: [0, 3, 6, 9], theoretical: 6 }), plain({ places: [0, 9, 18], theoretical: 6 }), plain({ places: [0, 0.3, 0.6, 0.9], theoretical: 0.2 })]);
  });

  it('say which rows are insufficient for what', () => {
    const figures = expectAsByRecords([
      plain({ places: [], days: [], up: [] }),
      plain({ places: [4] }),
      plain({ places: [4, 9] }),
      plain({ places: [4, 4, 4] }),
      plain({ up: [0, 0, 0] }),
      plain({ up: [3, 3, 3] }),
    ]);
    expect(figures.known[0]).toBe(0);
    expect((figures.known[5] ?? 0) & packedKnown.daysTo10AtLatest).not.toBe(0);
    expect((figures.known[5] ?? 0) & packedKnown.spread).toBe(0);
  });

  it.each([
    ['places out of order', { places: [6, 3] }],
    ['a place before the tape', { places: [-1, 3] }],
    ['a lone place before the tape', { places: [-1] }],
    ['a place that is no number', { places: [1, NaN, 3] }],
    ['a place without end', { places: [1, Infinity] }],
    ['no theoretical spacing', { theoretical: 0 }],
    ['no area', { area: 0 }],
    ['an area without end', { area: Infinity }],
    ['negative plants', { held: -1 }],
    ['plants without end', { held: Infinity }],
    ['a count without end', { up: [0, 2, Infinity] }],
    ['a day without end', { days: [8, 9, Infinity] }],
    ['plants that are no number', { held: NaN }],
    ['a negative count', { up: [-1, 2, 3] }],
    ['a count that is no number', { up: [0, NaN, 3] }],
    ['visits out of order', { days: [8, 8, 9] }],
    ['a visit before planting', { days: [-1, 8, 9] }],
  ])('refuse %s', (_, changes) => {
    expect(() => packedFigures(packed([plain(), plain(changes)]))).toThrow(ImpossibleInput);
  });

  it('keep each row to its own places and visits', () => {
    const two = packed([plain({ places: [0, 2, 17, 33], days: [8, 9], up: [1, 4] }), plain()]);
    expect([...two.placesFrom]).toEqual([0, 4, 7]);
    expect([...two.visitsFrom]).toEqual([0, 2, 5]);
    expect([...two.placesInches]).toEqual([0, 2, 17, 33, 0, 6, 13]);
    expect([...two.visitDays, ...two.plantsUp]).toEqual([8, 9, 8, 9, 10, 1, 4, 0, 2, 3]);
  });

  it('of no rows are no figures', () => {
    expect(packedFigures(packed([])).known).toHaveLength(0);
  });
});
