import type { Figures, Penalties } from './figures';
import type { LateShare } from './late-share';
import { chainOutcome, insufficient, mapOutcome, value, type Outcome } from './outcome';
import { carlsonDoergeClay } from './penalty/carlson-doerge-clay';
import type { LatePlants } from './penalty/late-plants';
import { lauerRankin2004 } from './penalty/lauer-rankin-2004';
import { lawles2012 } from './penalty/lawles-2012';
import { liu2004Spacing } from './penalty/liu-2004-spacing';
import { fordHicks1992 } from './penalty/ford-hicks-1992';
import { liu2004Late } from './penalty/liu-2004-late';
import { nafziger1991 } from './penalty/nafziger-1991';
import { nielsen2004 } from './penalty/nielsen-2004';
import { nielsenQuoted } from './penalty/nielsen-quoted';
import { novakRansom2018Late, novakRansom2018Skips } from './penalty/novak-ransom-2018';
import { ontarioLate } from './penalty/ontario-late';
import type { Penalty } from './penalty/penalty';

type PenaltyInputs = Pick<Figures, 'lateShare' | 'latePattern' | 'spacingInchesSd' | 'placement'>;

/**
 * What does each published study say this stand loses?
 *
 * Takes the crop and the late and spacing figures. Returns one answer a study, side by side and never added.
 * For a crop other than corn every one is insufficient; a study that counts leaf stages is insufficient
 * without them, since days are not turned into leaves; beyond what a study covered it is insufficient.
 * Throws ImpossibleInput as the studies do.
 * Method: late studies read the late share and the mean delay of the late plants, spacing rules the SD of the
 * spacings, skips the share of misses over places. What a late plant is depends on the limits shown with it.
 * Example: a quarter late by 11 days loses 6.8 % by Nafziger.
 */
export function penaltyFigures(crop: string, inputs: PenaltyInputs): Penalties {
  const forCorn = (answer: () => Outcome<Penalty>): Outcome<Penalty> =>
    crop === 'corn' ? answer() : insufficient('corn-only', 'corn', crop);
  const late = (study: (plants: LatePlants) => Outcome<Penalty>) =>
    forCorn(() => chainOutcome(latePlantsOf(inputs.lateShare), study));
  const leaves = (study: (lateShare: number, leavesBehind: number) => Outcome<Penalty>) =>
    forCorn(() => chainOutcome(inputs.lateShare, (share) => byLeaves(share, study)));
  const spacing = (study: (spacingInchesSd: number) => Penalty) =>
    forCorn(() => mapOutcome(inputs.spacingInchesSd, study));
  const pattern = inputs.latePattern.kind === 'value' ? inputs.latePattern.value.pattern : 'not-known';
  return {
    'nafziger-1991': late((plants) => nafziger1991(plants, pattern)),
    'ontario-late': late(ontarioLate),
    'lawles-2012-irrigated': late((plants) => lawles2012(plants, 'irrigated')),
    'lawles-2012-rainfed': late((plants) => lawles2012(plants, 'rainfed')),
    'novak-ransom-2018-late': late(novakRansom2018Late),
    'liu-2004-late': leaves(liu2004Late),
    'ford-hicks-1992': leaves(fordHicks1992),
    'novak-ransom-2018-skips': forCorn(() =>
      chainOutcome(inputs.placement, ({ ofPlaces }) => novakRansom2018Skips(ofPlaces.missesShare)),
    ),
    'carlson-doerge-clay': spacing(carlsonDoergeClay),
    'nielsen-quoted': spacing(nielsenQuoted),
    'nielsen-2004': spacing(nielsen2004),
    'lauer-rankin-2004': spacing(lauerRankin2004),
    'liu-2004-spacing': spacing(liu2004Spacing),
  };
}

function latePlantsOf(lateShare: Outcome<LateShare>): Outcome<LatePlants> {
  return chainOutcome(lateShare, (late) =>
    late.share === 0
      ? value({ lateShare: 0, delayDays: 0 })
      : mapOutcome(late.lateDelayDaysMean, (delayDays) => ({ lateShare: late.share, delayDays })),
  );
}

function byLeaves(
  late: LateShare,
  study: (lateShare: number, leavesBehind: number) => Outcome<Penalty>,
): Outcome<Penalty> {
  if (late.share === 0) return study(0, 0);
  return insufficient('leaf-stage-not-known', 'how many leaves the late plants are behind', 'days only');
}
