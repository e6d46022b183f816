import 'server-only';
import type { Replant } from '@/lib/agronomy/replant';
import { replantSentence, type ReplantWording } from '@/lib/agronomy/replant-sentence';
import { insufficient, value } from '@/lib/agronomy/outcome';
import { areaText } from '@/lib/format/area-text';
import { drawShareText } from '@/lib/format/draw-share-text';
import { fieldMoneyText } from '@/lib/format/field-money-text';
import { intervalText } from '@/lib/format/interval-text';
import { moneyPerAreaText } from '@/lib/format/money-per-area-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { unitName } from '@/lib/format/unit-name';
import type { ReplantBasis, ReplantSentencesShown, ReplantValue } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';

type Said = { answer: ReplantValue; acres: number | null; zoneAnswers: ReplantBasis['zoneAnswers'] };

/** What the answer says in one person's units: first the finding with its dollars, then how sure it is. */
export function replantSentences(
  { answer, acres, zoneAnswers }: Said,
  units: UnitSystem,
): ReplantSentencesShown {
  const wording = wordingIn(units);
  const { second, third } = replantSentence(asCoreAnswer(answer), wording);
  const { first } = replantSentence(asCoreAnswer(answer), {
    ...wording,
    dollarsPerAcre: (dollars) => withField(dollars, acres, units),
  });
  const interval = answer.overInterval;
  return {
    first,
    bound: third,
    zones: zoneAnswers.flatMap((zone) => zoneSentence(zone, answer, units)),
    sureness: [
      second,
      interval ? replantTexts.notInIt : replantTexts.notInItWithoutCount,
      ...(answer.because === 'within-table-rounding'
        ? [replantTexts.closeToRounding(perArea(answer.tableRoundingDollarsPerAcre, units))]
        : []),
      ...(interval && answer.because !== 'table-ends'
        ? [interval.anotherCountCouldTurnIt ? replantTexts.countingCouldTurn : replantTexts.countingCanStop]
        : []),
    ],
  };
}

function wordingIn(units: UnitSystem): ReplantWording {
  const stand = (plantsPerAcre: number) =>
    plantsPerAreaText(plantsPerAcre, units, { nearest: 100, withUnit: false });
  return {
    dollarsPerAcre: (dollars) => perArea(dollars, units),
    standRange: (lower, upper) => intervalText(lower, upper, stand, unitName('plants-per-area', units)),
    stand: (plantsPerAcre) => plantsPerAreaText(plantsPerAcre, units, { nearest: 100 }),
    share: drawShareText,
  };
}

function perArea(dollarsPerAcre: number, units: UnitSystem): string {
  return `${moneyPerAreaText(dollarsPerAcre, units, { withUnit: false })} ${replantTexts.anArea[units]}`;
}

function withField(dollarsPerAcre: number, acres: number | null, units: UnitSystem): string {
  if (acres === null) return perArea(dollarsPerAcre, units);
  return `${perArea(dollarsPerAcre, units)} (${replantTexts.forArea(fieldMoneyText(dollarsPerAcre * acres), areaText(acres, units))})`;
}

function zoneSentence(
  zone: ReplantBasis['zoneAnswers'][number],
  field: ReplantValue,
  units: UnitSystem,
): string[] {
  const { recommendation, gainDollarsPerAcre: gain } = zone;
  if (recommendation === null || gain === null || recommendation === field.recommendation) return [];
  const name = `${zone.name} (${areaText(zone.acres, units)})`;
  const says = replantTexts.zoneSays;
  if (recommendation === 'too-close' || recommendation === 'cannot-tell') return [says[recommendation](name)];
  const dollars = recommendation === 'keep' ? -gain.upper : gain.lower;
  const change =
    gain.lower === gain.upper
      ? replantTexts.about(perArea(dollars, units))
      : replantTexts.atLeast(perArea(dollars, units));
  return [says[recommendation](name, change)];
}

/** The core's own shape again, in which its sentences are made. */
function asCoreAnswer(answer: ReplantValue): Replant {
  const {
    keepReading,
    replantReading,
    keepYieldBushelsPerAcre,
    replantYieldBushelsPerAcre,
    lines,
    gainDollarsPerAcre,
  } = answer;
  return {
    ...answer,
    sum: {
      keepReading,
      replantReading,
      keepYieldBushelsPerAcre,
      replantYieldBushelsPerAcre,
      gainDollarsPerAcre,
      lines,
    },
    gainDollarsField: answer.gainDollarsField
      ? value(answer.gainDollarsField)
      : insufficient('acres-missing', 'acres', 'not given'),
    overInterval: answer.overInterval
      ? value(answer.overInterval)
      : insufficient('count-without-error', 'at least 2 row samples', 'no standard error'),
  };
}
