import { randomStream } from './random';
import type { RandomStream } from './random';
import type { Span } from './replant-sum';

export const REPLANT_DRAWS = 4000;

/** The count as a stand with its error, in plants per acre. */
export type StandCount = {
  plantsPerAcre: number;
  /** Null when the count cannot say how far off it is, as one row sample cannot. */
  error: {
    standardErrorPlantsPerAcre: number;
    degreesOfFreedom: number;
    lower: number;
    upper: number;
  } | null;
};

export type ReplantDraws = {
  draws: number;
  seed: number;
  keepWinsShare: number;
  replantWinsShare: number;
  /** Draws in which the table's bound leaves the answer open. */
  openShare: number;
};

/**
 * In how many plausible counts would keeping win?
 *
 * Takes the stand and its standard error (plants per acre), the degrees of freedom, a function from stand to the
 * span of the gain, and a seed. Returns shares of 4,000 draws. Never insufficient; throws for a bad seed.
 * Method: stand = count + standard error × t, t drawn from Student's distribution (Bailey 1994, Mathematics of
 * Computation 62:779: √(ν(U^(−2/ν) − 1)) × cos 2πV), a draw below no plants taken as none. A draw is won by keeping
 * when the whole span of the gain lies below zero, by replanting when it lies above.
 * What it does not tell: the error of the table, the price or the second stand: only the count is drawn.
 * Example: 20,500 ± 300 on 11 degrees of freedom and a gain of −$97 falling with the stand: keeping wins in all.
 */
export function replantDraws(
  count: { plantsPerAcre: number; standardErrorPlantsPerAcre: number; degreesOfFreedom: number },
  gainAtStand: (plantsPerAcre: number) => Span,
  seed: number,
): ReplantDraws {
  const stream = randomStream(seed);
  let keepWins = 0;
  let replantWins = 0;
  for (let draw = 0; draw < REPLANT_DRAWS; draw += 1) {
    const deviation = count.standardErrorPlantsPerAcre * studentDraw(stream, count.degreesOfFreedom);
    const gain = gainAtStand(Math.max(0, count.plantsPerAcre + deviation));
    if (gain.upper < 0) keepWins += 1;
    else if (gain.lower > 0) replantWins += 1;
  }
  return {
    draws: REPLANT_DRAWS,
    seed,
    keepWinsShare: keepWins / REPLANT_DRAWS,
    replantWinsShare: replantWins / REPLANT_DRAWS,
    openShare: (REPLANT_DRAWS - keepWins - replantWins) / REPLANT_DRAWS,
  };
}

/** One draw from Student's t distribution. */
export function studentDraw(stream: RandomStream, degreesOfFreedom: number): number {
  const unit = 1 - stream.nextUnit();
  const angle = 2 * Math.PI * stream.nextUnit();
  // expm1 keeps the small differences that unit^(−2/ν) − 1 loses at many degrees of freedom.
  return Math.sqrt(degreesOfFreedom * Math.expm1((-2 / degreesOfFreedom) * Math.log(unit))) * Math.cos(angle);
}
