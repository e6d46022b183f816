import { describe, expect, it } from 'vitest';
import { standZones } from '@/lib/agronomy/inference/stand-zones';
import { crustedTruth, simulateCrustedField } from '@/db/demo/simulate-crusted-field';
import { answerOf } from '../agronomy/answer-of';

const places = simulateCrustedField();
const areaAcres = (209 * 30) / 6_272_640;
const zone = ({ key, acres }: (typeof crustedTruth.zones)[number]) => ({
  acres,
  rowSamples: places.filter((place) => place.zoneKey === key).map((place) => ({ plantsHeld: place.plantsUp - place.doubtful / 2, areaAcres })),
});

describe('the crusted field of the demo', () => {
  it('is looked at in twelve places of 62 acres', () => {
    expect(places).toHaveLength(12);
    expect(crustedTruth.zones.reduce((acres, each) => acres + each.acres, 0)).toBe(62);
  });

  // The places were drawn so that they come to these means within 50 plants.
  it('holds 20,500 plants an acre over its acres, and 13,000 on the low 18', () => {
    const whole = answerOf(standZones(crustedTruth.zones.map(zone)));
    expect(Math.abs(whole.plantsPerAcre - crustedTruth.plantsPerAcre)).toBeLessThan(50);
    const low = answerOf(standZones([zone(crustedTruth.zones[0])]));
    expect(Math.abs(low.plantsPerAcre - 13_000)).toBeLessThan(50);
  });

  it('varies from place to place as a crusted field does', () => {
    const counts = places.map(({ plantsUp }) => plantsUp);
    expect(new Set(counts).size).toBeGreaterThan(5);
  });
});
