import { NumberSource } from '@/components/ui/number-source';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import type { ReplantBasis, ReplantValue } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';
import { entryOf, sumWords } from './sum-words';
import { TurningStand } from './turning-stand';

type BreakEvenProps = { basis: ReplantBasis; answer: ReplantValue; units: UnitSystem };

/** Down to which stand keeping still pays, as a number, a bound, or the words for neither. */
export function BreakEven({ basis, answer, units }: BreakEvenProps) {
  const texts = replantTexts.breakEven;
  const { breakEven } = answer;
  const stand = (plantsPerAcre: number) => plantsPerAreaText(plantsPerAcre, units, { nearest: 100 });
  const number = (plantsPerAcre: number) =>
    plantsPerAreaText(plantsPerAcre, units, { nearest: 100, withUnit: false });
  if (breakEven.kind !== 'stand') {
    const words =
      breakEven.kind === 'below-table'
        ? texts.belowTable(stand(breakEven.plantsPerAcre))
        : breakEven.kind === 'none-in-table'
          ? texts.noneInTable
          : texts.cannotTell;
    return (
      <div>
        <p className="text-15 font-bold">{texts.label}</p>
        <p>{words}</p>
      </div>
    );
  }
  const words = sumWords(basis, answer, units);
  const said = { exact: texts.about, 'at-most': replantTexts.atMost, 'at-least': replantTexts.atLeast }[
    breakEven.bound
  ];
  const text = said(stand(breakEven.plantsPerAcre));
  const entry = entryOf('break-even-stand');
  const inputs = [
    {
      name: replantTexts.sum.replantYield,
      text: words.bounded(answer.replantYieldBushelsPerAcre, answer.replantReading),
    },
    { name: replantTexts.inputs.fullYield, text: words.fullYield },
    ...(basis.stand ? [{ name: replantTexts.stand, text: stand(basis.stand.plantsPerAcre) }] : []),
  ];
  return (
    <div className="flex flex-col gap-2">
      <p className="text-15 font-bold">{texts.label}</p>
      <p className="text-21 font-bold">
        <NumberSource label={texts.label} text={text} inputs={inputs} {...(entry ? { entry } : {})} />
      </p>
      <p className="text-15">{breakEven.bound === 'exact' ? texts.exact : texts.bound}</p>
      {basis.stand ? (
        <TurningStand
          stand={basis.stand}
          breakEven={{
            plantsPerAcre: breakEven.plantsPerAcre,
            text: said(number(breakEven.plantsPerAcre)),
          }}
          units={units}
        />
      ) : null}
    </div>
  );
}
