import { plantsHeld, type PlantCount } from './plants-held';
import { plantsPerAcre } from './stand';

export type StandByDoubtful = {
  plantsPerAcreNoneLive: number;
  plantsPerAcreHalfLive: number;
  plantsPerAcreAllLive: number;
};

/**
 * What stand is it if none, half or all of the doubtful plants live?
 *
 * Takes the plants counted, of which doubtful (0 or more), what the ends are, the length and the row spacing in inches
 * (above 0). Returns plants per acre three times. Never insufficient; throws ImpossibleInput as plantsHeld and
 * plantsPerAcre do.
 * Method: the half is the stand shown everywhere (Wisconsin W120: a doubtful plant may count one half); none and all are
 * the bounds it could end at.
 * What it does not tell: which of them it will be. A second count, or a plant split lengthwise, does.
 * Example: 30 plants, 6 of them doubtful, in 1/1000 acre: 24,000, 27,000 or 30,000.
 */
export function standByDoubtful(
  row: PlantCount & { lengthInches: number; rowSpacingInches: number },
): StandByDoubtful {
  const perAcre = (held: number) => plantsPerAcre({ ...row, plantsHeld: held });
  const half = plantsHeld(row);
  return {
    plantsPerAcreNoneLive: perAcre(
      plantsHeld({ ...row, plantsUp: row.plantsUp - row.plantsDoubtful, plantsDoubtful: 0 }),
    ),
    plantsPerAcreHalfLive: perAcre(half),
    plantsPerAcreAllLive: perAcre(plantsHeld({ ...row, plantsDoubtful: 0 })),
  };
}
