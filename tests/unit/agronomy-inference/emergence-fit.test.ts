import { describe, expect, it } from 'vitest';
import { bestEmergenceFit, emergenceFit, type EmergenceFit } from '@/lib/agronomy/inference/emergence-fit';
import { emergenceLikelihood } from '@/lib/agronomy/inference/emergence-likelihood';
import { standardShapes, type EmergenceShape } from '@/lib/agronomy/inference/emergence-shape';
import { newtonMaximum } from '@/lib/agronomy/inference/newton-maximum';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { seenBetween } from '@/lib/agronomy/seen-between';
import type { SeenBetween } from '@/lib/agronomy/turnbull';
import madeInR from '../../reference/emergence-fit.json';
import { answerOf } from '../agronomy/answer-of';

const { survreg, byLogs, byLastVisit, finalShare } = madeInR;
type Case = { lower: number[]; upper: (number | null)[]; count: number[] };
type FitInR = (typeof survreg)[number]['fits'][number];
const seenOf = ({ lower, upper, count }: Case): SeenBetween[] => lower.map((afterDays, index) => ({ afterDays, byDays: upper[index] ?? null, plants: count[index] ?? 0 }));
const near = (expected: number, relative = 1e-5) => expect.closeTo(expected, Math.max(0, Math.round(-Math.log10(Math.abs(expected) * relative * 2))));
const within = (actual: number, expected: number, relative: number) => expect(Math.abs(actual - expected), `${actual} for ${expected}`).toBeLessThanOrEqual(relative * Math.abs(expected));

const each = <F extends { shape: string }, C extends { title: string; fits: F[] }>(cases: C[]) =>
  cases.flatMap((one) => one.fits.map((fit) => [one.title, fit.shape as EmergenceShape, one, fit as C['fits'][number]] as const));
const daily = survreg[0] as Case;
const unseen = survreg[2] as Case;

function agrees(fit: EmergenceFit, expected: FitInR) {
  within(fit.location.estimate, expected.mu, 1e-6);
  within(fit.scale.estimate, expected.sigma, 1e-5);
  within(fit.location.standardError, expected.seMu, 1e-4);
  within(fit.scale.standardError, expected.seLogSigma * expected.sigma, 1e-4);
  within(fit.logLikelihood, expected.loglik, 1e-8);
  within(fit.aic, 2 * (fit.finalShare ? 3 : 2) - 2 * expected.loglik, 1e-8);
  [fit.daysTo10, fit.daysTo50, fit.daysTo90].forEach((days, index) => {
    within(days.estimate, expected.quantiles[index] ?? NaN, 1e-5);
    within(days.standardError, expected.se[index] ?? NaN, 1e-4);
  });
  within(fit.spreadDays.estimate, expected.spread, 1e-5);
  within(fit.spreadDays.standardError, expected.seSpread, 1e-4);
}

// R 4.2.2, survival 3.5-3, by tests/reference/r/emergence-fit.R.
describe('a smooth curve on interval-censored counts', () => {
  it.each(each(survreg))('agrees with survreg of R: %s, %s', (_, shape, one, expected) => {
    const fit = answerOf(emergenceFit(seenOf(one), shape, 'seeds'));
    agrees(fit, expected);
    expect(fit.finalShare).toBeNull();
  });

  // survreg reaches no maximum here: its shares are held up from below. Optim on logarithms of tails does.
  it.each(each(byLogs))('finds the top though one plant lies far in a tail: %s, %s', (_, shape, one, expected) => {
    agrees(answerOf(emergenceFit(seenOf(one), shape)), expected);
  });

  it.each(each(byLastVisit))('conditional on the last visit agrees with optim of R: %s, %s', (_, shape, one, expected) => {
    // The last visit found nothing new where it is later than the last interval.
    const seen = [...seenOf(one), { afterDays: one.last - 1, byDays: one.last, plants: 0 }];
    const fit = answerOf(emergenceFit(seen, shape, 'emerged-by-last-visit'));
    agrees(fit, expected);
    expect(fit.basis).toBe('emerged-by-last-visit');
    // Those still to come are later than those seen.
    expect(fit.daysTo90.estimate).toBeGreaterThan(answerOf(emergenceFit(seen, shape)).daysTo90.estimate);
  });

  it('conditional on a last visit long after the last plant is the curve of the plants that emerged', () => {
    const late = [...seenOf(daily), { afterDays: 11, byDays: 400, plants: 0 }];
    const conditional = answerOf(emergenceFit(late, 'log-normal', 'emerged-by-last-visit'));
    const plain = answerOf(emergenceFit(late, 'log-normal'));
    within(conditional.daysTo50.estimate, plain.daysTo50.estimate, 1e-9);
    within(conditional.logLikelihood, plain.logLikelihood, 1e-12);
  });

  it('conditional on the last visit asks of the seeds not seen only when that visit was', () => {
    const one = byLastVisit[0] as (typeof byLastVisit)[number];
    const unseenSeeds = { afterDays: one.last, byDays: null, plants: 400 };
    expect(emergenceFit([...seenOf(one), unseenSeeds], 'log-normal', 'emerged-by-last-visit')).toEqual(emergenceFit(seenOf(one), 'log-normal', 'emerged-by-last-visit'));
  });

  it('conditional on a last visit says it does not settle where plants only ever came faster', () => {
    const rising = [2, 6, 20, 70].map((plants, index) => ({ afterDays: 5 + index, byDays: 6 + index, plants }));
    expect(emergenceFit(rising, 'log-normal', 'emerged-by-last-visit')).toMatchObject({ kind: 'insufficient', reason: 'fit-does-not-settle' });
  });

  it.each(each(finalShare))('with a final share agrees with optim of R: %s, %s', (_, shape, one, expected) => {
    const fit = answerOf(emergenceFit(seenOf(one), shape, 'seeds-with-final-share'));
    agrees(fit, expected);
    within(fit.finalShare?.estimate ?? NaN, expected.share, 1e-5);
    within(fit.finalShare?.standardError ?? NaN, expected.seShare, 1e-4);
  });

  it('of the plants that emerged leaves the unseen seeds out', () => {
    // SURV-03 of the reference values is SURV-02 without its five seeds.
    const without = answerOf(emergenceFit(seenOf(unseen), 'log-normal'));
    within(without.location.estimate, 1.86822554100991, 1e-6);
    expect(without.basis).toBe('emerged');
    within(answerOf(emergenceFit(seenOf(unseen), 'log-normal', 'seeds')).location.estimate, 1.98194822099059, 1e-6);
  });

  it('recovers a truth that the mean of count days misses', () => {
    // SURV-08: simulated with location 1.9741 and scale 0.22, and no visit from day 7 to day 10.
    const fit = answerOf(emergenceFit(seenOf(survreg[5] as Case), 'log-normal'));
    within(fit.location.estimate, 1.97433841593445, 1e-6);
    within(fit.scale.estimate, 0.220587433476921, 1e-5);
    within(fit.location.estimate, 1.97408102602201, 1e-3);
  });

  it('with all seeds up has a final share of 1 on its bound, without an error of its own', () => {
    const seen = [...seenOf(daily), { afterDays: 7, byDays: null, plants: 0.001 }];
    const fit = answerOf(emergenceFit(seen, 'log-normal', 'seeds-with-final-share'));
    expect(fit.finalShare).toEqual({ estimate: 1, standardError: null });
    within(fit.daysTo50.estimate, 6.10196868153108, 1e-3);
    expect(fit.aic).toBeGreaterThan(answerOf(emergenceFit(seen, 'log-normal', 'seeds')).aic + 1.9);
    expect(answerOf(emergenceFit(seenOf(daily), 'log-normal', 'seeds-with-final-share')).finalShare).toBeNull();
  });

  it.each([
    ['nearly all stood there at the first visit', [{ afterDays: 0, byDays: 1, plants: 10 }, { afterDays: 1, byDays: 30, plants: 1 }, { afterDays: 30, byDays: 31, plants: 1 }], 'emerged', 'flat'],
    ['the same, with a final share', [{ afterDays: 0, byDays: 1, plants: 10 }, { afterDays: 1, byDays: 30, plants: 1 }, { afterDays: 30, byDays: 31, plants: 1 }, { afterDays: 31, byDays: null, plants: 1 }], 'seeds-with-final-share', 'flat'],
    ['4 of 5,004 seeds are up', [{ afterDays: 5, byDays: 6, plants: 1 }, { afterDays: 6, byDays: 7, plants: 1 }, { afterDays: 7, byDays: 8, plants: 2 }, { afterDays: 8, byDays: null, plants: 5000 }], 'seeds', 'flat'],
    ['all but two of thousands stood there at the first visit', [{ afterDays: 0, byDays: 8, plants: 5000 }, { afterDays: 8, byDays: 9, plants: 1 }, { afterDays: 9, byDays: 10, plants: 1 }], 'emerged', 'none'],
  ] as const)('does not settle where %s', (_, seen, basis, had) => {
    expect(emergenceFit(seen, 'log-normal', basis)).toMatchObject({ kind: 'insufficient', reason: 'fit-does-not-settle', had: expect.stringContaining(had) });
  });

  it('is chosen by AIC, with every shape to be seen', () => {
    const { best, fits } = answerOf(bestEmergenceFit(seenOf(daily)));
    // AIC in R: log-normal 125.49, log-logistic 125.10, Weibull 138.31.
    expect(best.shape).toBe('log-logistic');
    expect(best.aic).toEqual(near(125.095394109286));
    expect(Object.values(fits).map((fit) => fit.kind)).toEqual(['value', 'value', 'value']);
  });

  it('needs three intervals with plants, and says to interpolate', () => {
    const two = [{ afterDays: 5, byDays: 6, plants: 10 }, { afterDays: 6, byDays: 7, plants: 12 }, { afterDays: 7, byDays: 8, plants: 0 }, { afterDays: 8, byDays: null, plants: 4 }];
    expect(emergenceFit(two, 'weibull')).toMatchObject({ kind: 'insufficient', reason: 'too-few-intervals', had: '2', needed: expect.stringContaining('interpolation') });
    expect(bestEmergenceFit(two)).toMatchObject({ kind: 'insufficient', reason: 'too-few-intervals' });
    expect(emergenceFit([], 'weibull')).toMatchObject({ had: '0' });
  });

  it.each([
    [{ afterDays: -1, byDays: 5, plants: 1 }],
    [{ afterDays: 5, byDays: 5, plants: 1 }],
    [{ afterDays: 5, byDays: 6, plants: -1 }],
    [{ afterDays: NaN, byDays: 6, plants: 1 }],
    [{ afterDays: 5, byDays: Infinity, plants: 1 }],
  ])('refuses %j', (wrong) => {
    expect(() => emergenceFit([...seenOf(daily), wrong], 'log-normal')).toThrow(ImpossibleInput);
  });
});

describe('the standard shapes', () => {
  // R 4.2.2: qnorm, qlogis and log(-log(1 - p)).
  it.each([
    ['log-normal', 0.9, 1.2815515655446004],
    ['log-normal', 0.001, -3.090232306167813],
    ['log-normal', 0.5, 0],
    ['log-logistic', 0.9, 2.197224577336219],
    ['weibull', 0.9, 0.834032445247956],
    ['weibull', 0.1, -2.250367327312445],
  ] as const)('have their quantiles: %s at %d is %d', (shape, share, expected) => {
    expect(standardShapes[shape].quantile(share)).toBeCloseTo(expected, 9);
    expect(standardShapes[shape].below(expected)).toBeCloseTo(share, 9);
  });
});

describe('the share between two places', () => {
  // R 4.2.2: pnorm, plogis and pweibull with log.p = TRUE, and differences of them.
  it.each([
    ['log-normal', -Infinity, -2.5, -5.08164827727869],
    ['log-normal', -Infinity, -2.500001, -5.08165110002394],
    ['log-normal', -Infinity, -5, -15.0649983939887],
    ['log-normal', -Infinity, -38, -726.55721601882],
    ['log-normal', -Infinity, -100, -5005.52420869421],
    ['log-normal', 100, Infinity, -5005.52420869421],
    ['log-normal', -3, -2, -3.844353426334205],
    ['log-normal', 30, 31, -454.321243956343],
    ['log-normal', -4, 1, -0.172791423328125],
    ['log-logistic', -Infinity, -50, -50],
    ['log-logistic', 60, Infinity, -60],
    ['weibull', 0, Infinity, -1],
    // Own arithmetic: ln(1 − exp(−eᵘ)) is u for u far below 0, and −eᵘ of the later end is nothing beside it.
    ['weibull', -Infinity, -50, -50],
    ['weibull', 5, 6, -Math.exp(5)],
    ['log-normal', -Infinity, Infinity, 0],
    ['log-logistic', -Infinity, Infinity, 0],
    ['weibull', -Infinity, Infinity, 0],
  ] as const)('keeps its digits however small it is: %s, %d to %d', (shape, low, high, expected) => {
    expect(standardShapes[shape].logBetween(low, high)).toBeCloseTo(expected, expected < -100 ? 9 : 11);
  });

  it('makes a likelihood that is never held up from below', () => {
    const far = [{ afterDays: 100, byDays: 101, plants: 1 }];
    const at = (location: number) => emergenceLikelihood(far, 'log-normal', { location, scale: 0.01, finalShareLogit: null }, null);
    expect(at(0)).toBeLessThan(-100_000);
    expect(at(0.1)).toBeGreaterThan(at(0));
    // Own arithmetic: half of them are up by the median; of half the seeds, a quarter.
    const up = [{ afterDays: 0, byDays: 5, plants: 10 }];
    const median = { location: Math.log(5), scale: 0.3, finalShareLogit: null };
    expect(emergenceLikelihood(up, 'log-normal', median, null)).toBeCloseTo(10 * Math.log(0.5), 12);
    expect(emergenceLikelihood(up, 'log-normal', { ...median, finalShareLogit: 0 }, null)).toBeCloseTo(10 * Math.log(0.25), 12);
    expect(emergenceLikelihood(up, 'log-normal', median, 5)).toBeCloseTo(0, 12);
    expect(emergenceLikelihood([{ afterDays: 5, byDays: null, plants: 10 }], 'log-normal', { ...median, finalShareLogit: 0 }, null)).toBeCloseTo(10 * Math.log(0.75), 12);
  });
});

describe('what was seen between visits', () => {
  it('is the increments of the curve, and the seeds not seen', () => {
    const counts = [5, 6, 8, 9, 12].map((days, index) => ({ days, plantsUp: [3, 12, 23, 27, 29][index] ?? 0 }));
    expect(answerOf(seenBetween(counts, 34))).toEqual([
      { afterDays: 0, byDays: 5, plants: 3 }, { afterDays: 5, byDays: 6, plants: 9 }, { afterDays: 6, byDays: 8, plants: 11 },
      { afterDays: 8, byDays: 9, plants: 4 }, { afterDays: 9, byDays: 12, plants: 2 }, { afterDays: 12, byDays: null, plants: 5 },
    ]);
    expect(answerOf(seenBetween(counts, null))).toHaveLength(5);
    expect(answerOf(seenBetween(counts, 20))).toHaveLength(5);
  });

  it('smooths a fall, and leaves visits out that found nothing new', () => {
    expect(answerOf(seenBetween([{ days: 4, plantsUp: 0 }, { days: 5, plantsUp: 9 }, { days: 6, plantsUp: 8 }, { days: 7, plantsUp: 12 }], null))).toEqual([
      { afterDays: 4, byDays: 5, plants: 8.5 }, { afterDays: 6, byDays: 7, plants: 3.5 },
    ]);
  });

  it('is insufficient without plants, and refuses plants at planting and seeds that are none', () => {
    expect(seenBetween([], 34)).toMatchObject({ reason: 'no-counts' });
    expect(() => seenBetween([{ days: 0, plantsUp: 1 }], 34)).toThrow(ImpossibleInput);
    expect(() => seenBetween([{ days: 5, plantsUp: 1 }], 0)).toThrow(ImpossibleInput);
  });
});

describe('a top by Newton’s steps', () => {
  it('is found with its information', () => {
    const top = newtonMaximum(([x, y]) => -(((x ?? 0) - 2) ** 2) - 3 * ((y ?? 0) + 1) ** 2 + 5, [0, 0]);
    expect(top?.at[0]).toBeCloseTo(2, 6);
    expect(top?.at[1]).toBeCloseTo(-1, 6);
    expect(top?.value).toBeCloseTo(5, 9);
    expect(top?.information[0]?.[0]).toBeCloseTo(2, 3);
    expect(top?.information[1]?.[1]).toBeCloseTo(6, 3);
  });

  it('is null where there is none', () => {
    expect(newtonMaximum(([x]) => x ?? 0, [0])).toBeNull();
    expect(newtonMaximum(() => NaN, [0])).toBeNull();
  });

  it('is told as flat by its information where a rise only ever slows', () => {
    expect(newtonMaximum(([x]) => -Math.exp(-(x ?? 0)), [0])?.information[0]?.[0]).toBeLessThan(1e-9);
  });
});
