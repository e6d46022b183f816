import type { StripFigure } from './block-analysis';

/** A strip of one of several trials; the environment is the field or the year. */
export type EnvironmentStrip = StripFigure & { environment: string };

/** Which strips belong to each field or year? In the order in which environments first came. */
export function environmentsOf(
  strips: readonly EnvironmentStrip[],
): { environment: string; strips: EnvironmentStrip[] }[] {
  return [...new Set(strips.map((strip) => strip.environment))].map((environment) => ({
    environment,
    strips: strips.filter((strip) => strip.environment === environment),
  }));
}

/** All strips as one trial: a block of one environment is never that of another, whatever its name. */
export function inOneTrial(strips: readonly EnvironmentStrip[]): StripFigure[] {
  return strips.map(({ environment, block, setting, figure }) => ({
    block: JSON.stringify([environment, block]),
    setting,
    figure,
  }));
}
