import type { SeenBetween } from '../turnbull';
import { emergenceLikelihood } from './emergence-likelihood';
import type { EmergenceShape } from './emergence-shape';
import { newtonMaximum, type Maximum } from './newton-maximum';

/** `information` is of: location in units of `scale`, the logarithm of scale and, with a final share, the logit of d. */
export type LikeliestCurve = { location: number; scale: number; finalShare: number | null; logLikelihood: number; information: number[][] };

export type CurveSought = { shape: EmergenceShape; fitsShare: boolean; byLastVisitDays: number | null };

/**
 * Which curve of this shape makes the counts likeliest?
 *
 * Takes intervals with plants (three or more of them different), the shape, whether a final share d is fitted, and the day of
 * the last visit for a conditional likelihood or null. Returns the curve with its observed information, or null where no top
 * is found. Throws nothing.
 * Method: Newton’s steps in −location/scale and 1/scale, in which the log-likelihood of each of the three shapes has a single
 * top (their densities are log-concave; Burridge 1981, J. R. Statist. Soc. B 43:41, from memory), then once more about that top for exact
 * differences. With a final share it may have several tops: the highest of two starts. Conditional on the last visit it may
 * have none, or a ridge.
 * What it does not tell: whether the top is sharp enough to be of use. Example: see emergenceFit.
 */
export function likeliestCurve(counted: readonly SeenBetween[], { shape, fitsShare, byLastVisitDays }: CurveSought): LikeliestCurve | null {
  const guess = guessed(counted);
  const likelihood = (location: number, scale: number, logit: number | undefined) =>
    scale > 0 ? emergenceLikelihood(counted, shape, { location, scale, finalShareLogit: logit ?? null }, byLastVisitDays) : -Infinity;
  const tops = (fitsShare ? logitsOf(counted) : [undefined]).flatMap((logit) => {
    const curveAt = ([away, steepness, ...rest]: readonly number[]) => ({
      location: guess.location - (guess.scale * (away as number)) / (steepness as number),
      scale: guess.scale / (steepness as number),
      logit: rest[0],
    });
    const heightAt = (at: readonly number[]) => {
      const { location, scale, logit: one } = curveAt(at);
      return likelihood(location, scale, one);
    };
    const begin = highestOf(START_STEEPNESSES.map((steepness) => [0, steepness, ...(logit === undefined ? [] : [logit])]), heightAt);
    const rough = newtonMaximum(heightAt, begin);
    return rough ? aboutItself(curveAt(rough.at), likelihood) : [];
  });
  return tops.length > 0 ? highestOf(tops, (top) => top.logLikelihood) : null;
}

type Curve = { location: number; scale: number; logit: number | undefined };

/** The same top with differences taken in units of its own scale. */
function aboutItself(rough: Curve, likelihood: (location: number, scale: number, logit: number | undefined) => number): LikeliestCurve[] {
  const placed = ([away, logTimes, logit]: readonly number[]) => [rough.location + rough.scale * (away as number), rough.scale * Math.exp(logTimes as number), logit] as const;
  const top: Maximum | null = newtonMaximum((at) => likelihood(...placed(at)), [0, 0, ...(rough.logit === undefined ? [] : [rough.logit])]);
  if (!top) return [];
  const [location, scale, logit] = placed(top.at);
  const rescaled = [scale / rough.scale, ...top.at.slice(1).map(() => 1)];
  const information = top.information.map((row, i) => row.map((each, j) => each * (rescaled[i] as number) * (rescaled[j] as number)));
  return [{ location, scale, finalShare: logit === undefined ? null : shareOf(logit), logLikelihood: top.value, information }];
}

/** A plant far from the others makes the first guess of the scale too narrow for its tail, or much too wide for the rest. */
const START_STEEPNESSES = [0.25, 0.5, 1, 2, 4];

const shareOf = (logit: number) => 1 / (1 + Math.exp(-logit));

function highestOf<T>(all: readonly T[], heightOf: (one: T) => number): T {
  return all.reduce((best, each) => (heightOf(each) > heightOf(best) ? each : best));
}

/** Mean and standard deviation of the logarithms of the intervals’ middles. */
function guessed(counted: readonly SeenBetween[]): { location: number; scale: number } {
  const middles = counted.flatMap(({ afterDays, byDays, plants }) => (byDays === null ? [] : [{ plants, at: Math.log((afterDays + byDays) / 2) }]));
  const total = middles.reduce((sum, { plants }) => sum + plants, 0);
  const location = middles.reduce((sum, { plants, at }) => sum + plants * at, 0) / total;
  const variance = middles.reduce((sum, { plants, at }) => sum + plants * (at - location) ** 2, 0) / total;
  // Intervals about one middle have no spread between them; the steps find theirs.
  return { location, scale: Math.max(1e-3, Math.sqrt(variance)) };
}

/** Two starts for d: those seen are all that ever come, or nearly all seeds are still to come. */
function logitsOf(counted: readonly SeenBetween[]): number[] {
  const plants = (some: readonly SeenBetween[]) => some.reduce((sum, each) => sum + each.plants, 0);
  return [plants(counted.filter(({ byDays }) => byDays !== null)) / plants(counted), 0.98].map((share) => Math.log(share / (1 - share)));
}
