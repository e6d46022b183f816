import { describe, expect, it } from 'vitest';
import { bestEmergenceFit, emergenceFit } from '@/lib/agronomy/inference/emergence-fit';
import { standardShapes, type EmergenceShape } from '@/lib/agronomy/inference/emergence-shape';
import { newtonMaximum } from '@/lib/agronomy/inference/newton-maximum';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { seenBetween } from '@/lib/agronomy/seen-between';
import type { SeenBetween } from '@/lib/agronomy/turnbull';
import madeInR from '../../reference/emergence-fit.json';
import { answerOf } from '../agronomy/answer-of';

type Case = (typeof madeInR)[number];
const seenOf = ({ lower, upper, count }: Case): SeenBetween[] => lower.map((afterDays, index) => ({ afterDays, byDays: upper[index] ?? null, plants: count[index] ?? 0 }));
const near = (expected: number, relative = 1e-5) => expect.closeTo(expected, Math.max(0, Math.round(-Math.log10(Math.abs(expected) * relative * 2))));
const within = (actual: number, expected: number, relative: number) => expect(Math.abs(actual - expected), `${actual} for ${expected}`).toBeLessThanOrEqual(relative * Math.abs(expected));

const each = madeInR.flatMap((one) => one.fits.map((fit) => [one.title, fit.shape as EmergenceShape, one, fit] as const));
const finals = madeInR.flatMap((one) => (one.finalShare as { shape: string; mu: number; sigma: number; share: number; loglik: number }[]).map((fit) => [one.title, fit.shape as EmergenceShape, one, fit] as const));
const daily = madeInR[0] as Case;
const unseen = madeInR[2] as Case;

describe('a smooth curve on interval-censored counts', () => {
  // R 4.2.2, survival 3.5-3, survreg on type interval2; tests/reference/r/emergence-fit.R.
  it.each(each)('agrees with survreg of R: %s, %s', (_, shape, one, expected) => {
    const fit = answerOf(emergenceFit(seenOf(one), shape, 'seeds'));
    within(fit.location.estimate, expected.mu, 1e-6);
    within(fit.scale.estimate, expected.sigma, 1e-5);
    within(fit.location.standardError, expected.seMu, 1e-4);
    within(fit.scale.standardError, expected.seLogSigma * expected.sigma, 1e-4);
    within(fit.logLikelihood, expected.loglik, 1e-8);
    within(fit.aic, 4 - 2 * expected.loglik, 1e-8);
    [fit.daysTo10, fit.daysTo50, fit.daysTo90].forEach((days, index) => {
      within(days.estimate, expected.quantiles[index] ?? NaN, 1e-5);
      within(days.standardError, expected.se[index] ?? NaN, 1e-4);
    });
    within(fit.spreadDays.estimate, expected.spread, 1e-5);
    within(fit.spreadDays.standardError, expected.seSpread, 1e-4);
    expect(fit.finalShare).toBeNull();
  });

  it.each(finals)('with a final share agrees with optim of R: %s, %s', (_, shape, one, expected) => {
    const fit = answerOf(emergenceFit(seenOf(one), shape, 'seeds-with-final-share'));
    // optim stops earlier than we do.
    within(fit.location.estimate, expected.mu, 1e-4);
    within(fit.scale.estimate, expected.sigma, 1e-3);
    within(fit.finalShare?.estimate ?? NaN, expected.share, 1e-4);
    expect(fit.logLikelihood).toBeGreaterThanOrEqual(expected.loglik - 1e-6);
    expect(fit.finalShare?.standardError ?? 0).toBeGreaterThan(0.02);
    within(fit.aic, 6 - 2 * expected.loglik, 1e-6);
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
    const fit = answerOf(emergenceFit(seenOf(madeInR[5] as Case), 'log-normal'));
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
  });
});
