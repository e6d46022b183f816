import { BarWithUncertainty, type UncertainBar } from '@/components/charts/bar-with-uncertainty';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { intervalText } from '@/lib/format/interval-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { shownInUnits } from '@/lib/format/shown-in-units';
import { unitName } from '@/lib/format/unit-name';
import { yieldText } from '@/lib/format/yield-text';
import type { ReadingOfTable, ReplantBasis, ReplantSpan, ReplantValue } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';

type YieldBarsProps = { basis: ReplantBasis; answer: ReplantValue; units: UnitSystem };

/** What keeping and what replanting makes, beside each other, each with what is known of its uncertainty. */
export function YieldBars({ basis, answer, units }: YieldBarsProps) {
  const texts = replantTexts.bars;
  const stand = (plantsPerAcre: number) =>
    plantsPerAreaText(plantsPerAcre, units, { nearest: 100, withUnit: false });
  const day = dateText(basis.sheet?.inputs.replantOn ?? basis.plantedOn, 'day-and-month');
  const bars = [
    bar(
      'keep',
      texts.keep(stand(basis.stand?.plantsPerAcre ?? 0)),
      answer.keepYieldBushelsPerAcre,
      answer.keepReading,
      answer.keepYieldOverCount,
      units,
    ),
    bar(
      'replant',
      texts.replant(day, stand(answer.terms.replantPlantsPerAcre)),
      answer.replantYieldBushelsPerAcre,
      answer.replantReading,
      answer.replantYieldOverSecondStand && { ...answer.replantYieldOverSecondStand, lowerIsBound: false },
      units,
    ),
  ];
  return (
    <BarWithUncertainty
      title={texts.title}
      unit={unitName('yield', units)}
      sample={texts.sample(countText(basis.countedRows.length, 'row sample'))}
      uncertainty={answer.isBounded ? `${texts.uncertainty}. ${texts.bounded}` : texts.uncertainty}
      fileName="keep-or-replant"
      bars={bars}
    />
  );
}

function bar(
  id: 'keep' | 'replant',
  label: string,
  made: ReplantSpan,
  reading: ReadingOfTable,
  range: ReplantValue['keepYieldOverCount'],
  units: UnitSystem,
): UncertainBar {
  const shown = (bushelsPerAcre: number) => shownInUnits(bushelsPerAcre, 'yield', units);
  const text = yieldText(made.upper, units);
  const isBound = reading.kind === 'at-most';
  // A bound has no range of its own: all that is known is that the yield does not pass the bar's end.
  const ends = isBound ? null : range;
  return {
    id,
    label,
    value: shown(made.upper),
    lower: shown(ends?.lower ?? made.upper),
    upper: shown(ends?.upper ?? made.upper),
    text: isBound ? replantTexts.atMost(text) : text,
    intervalText: ends ? rangeText(ends, units) : replantTexts.bars.noRange,
    isBound,
    look: id === 'keep' ? 'solid' : 'hatched',
  };
}

function rangeText(range: NonNullable<ReplantValue['keepYieldOverCount']>, units: UnitSystem): string {
  const end = (bushelsPerAcre: number) => yieldText(bushelsPerAcre, units, { withUnit: false });
  return range.lowerIsBound
    ? replantTexts.bars.orLess(end(range.lower), end(range.upper))
    : intervalText(range.lower, range.upper, end);
}
