import { describe, expect, it } from 'vitest';
import { degreeDaysFahrenheit } from '@/lib/agronomy/degree-days';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { emergencePercentile } from '@/lib/agronomy/emergence-percentile';
import { expectedEmergenceHeat } from '@/lib/agronomy/expected-emergence-heat';
import { heatCurve } from '@/lib/agronomy/heat-curve';
import { heatSincePlanting } from '@/lib/agronomy/heat-since-planting';
import { lateClassBy } from '@/lib/agronomy/late-class-by';
import { meanEmergenceTime } from '@/lib/agronomy/mean-emergence-time';
import { value } from '@/lib/agronomy/outcome';
import { timingDetailEntries } from '@/lib/agronomy/register/timing-detail-entries';
import type { WorkedExample } from '@/lib/agronomy/register/register-entry';
import { rowToRowDays } from '@/lib/agronomy/row-to-row-days';
import { shareUpWithin } from '@/lib/agronomy/share-up-within';
import { synchrony } from '@/lib/agronomy/synchrony';
import { turnbull } from '@/lib/agronomy/turnbull';
import { answerOf } from './answer-of';

type Inputs = WorkedExample['inputs'];
const many = (inputs: Inputs, name: string) => inputs[name] as readonly number[];
const one = (inputs: Inputs, name: string) => inputs[name] as number;
const visits = (inputs: Inputs) => many(inputs, 'days').map((days, index) => ({ days, plantsUp: many(inputs, 'plantsUp')[index] ?? 0 }));
const curveOf = (days: readonly number[], plantsUp: readonly number[]) => answerOf(emergenceCurve(days.map((each, index) => ({ days: each, plantsUp: plantsUp[index] ?? 0 }))));
const heat = (degreeDaysF: number) => value({ degreeDaysF, degreeDaysC: degreeDaysF / 1.8, convention: 'by-the-hour' as const, plantingDayShare: 1 });

/** How each worked example is figured again by the code it explains. */
const again: Record<string, (inputs: Inputs) => Record<string, number>> = {
  'mean-emergence-time': (inputs) => {
    const mean = answerOf(meanEmergenceTime(answerOf(emergenceCurve(visits(inputs)))));
    return { days: mean.byCountDays, variance: answerOf(mean.varianceDaysSquared) };
  },
  synchrony: (inputs) => ({ synchrony: answerOf(synchrony(visits(inputs))) }),
  'share-up-within': (inputs) => ({ share: answerOf(shareUpWithin(answerOf(emergenceCurve(visits(inputs))), 'half-up', one(inputs, 'hours'))).share }),
  'row-to-row': (inputs) => {
    const rows = answerOf(rowToRowDays(many(inputs, 'half').map((day) => curveOf([day - 1, day, day + 1], [0, 10, 20]))));
    return { apart: rows.apartDays, sd: rows.sdDays };
  },
  'late-by-collars-and-heat': (inputs) => ({ late: lateClassBy({ by: 'degree-days', degreeDaysF: one(inputs, 'degreeDays') }) === 'late' ? 1 : 0 }),
  'degree-days': (inputs) => ({ degreeDays: degreeDaysFahrenheit(one(inputs, 'high'), one(inputs, 'low')) }),
  'heat-since-planting': (inputs) => ({
    degreeDays: answerOf(
      heatSincePlanting({
        weather: many(inputs, 'high').map((highF, day) => ({ day, highF, lowF: many(inputs, 'low')[day] ?? 0 })),
        plantedAtPart: null, visitDay: 4, visitPart: 0.3, convention: 'through-yesterday',
      }),
    ).degreeDaysF,
  }),
  'timing-on-heat': (inputs) => {
    const curve = curveOf([9, 10, 11, 12], many(inputs, 'plantsUp'));
    return { half: answerOf(emergencePercentile(answerOf(heatCurve(curve, many(inputs, 'heat').map(heat))), 0.5)).days };
  },
  'expected-emergence-heat': (inputs) => {
    const expected = expectedEmergenceHeat({ seedingDepthInches: one(inputs, 'depth'), seedZoneDry: true, residueCoverShare: 0.1, soil: 'medium' });
    return { earliest: expected.earliestDegreeDaysF, usual: expected.usualDegreeDaysF, latest: expected.latestDegreeDaysF };
  },
  'model-free-emergence': (inputs) => {
    const shares = answerOf(turnbull(many(inputs, 'lower').map((afterDays, index) => ({ afterDays, byDays: many(inputs, 'upper')[index] ?? null, plants: many(inputs, 'count')[index] ?? 0 }))));
    const by = (day: number) => shares.filter(({ byDays }) => byDays !== null && byDays <= day).reduce((sum, { share }) => sum + share, 0);
    return { six: by(6), eight: by(8) };
  },
};

describe('the register of timing details', () => {
  it.each(timingDetailEntries.map((entry) => [entry.id, entry] as const))('figures its worked example again: %s', (id, entry) => {
    const figured = again[id]?.(entry.workedExample.inputs) ?? {};
    expect(Object.keys(figured).sort()).toEqual(Object.keys(entry.workedExample.expected).sort());
    for (const [name, expected] of Object.entries(entry.workedExample.expected)) {
      expect(Math.abs((figured[name] ?? NaN) - expected)).toBeLessThanOrEqual(entry.workedExample.tolerance + 1e-12);
    }
  });
});
