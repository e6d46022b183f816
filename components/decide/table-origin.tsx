import { countText } from '@/lib/format/count-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { yieldText } from '@/lib/format/yield-text';
import type { ReplantBasis } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';

const publishedIn = 1994;
/** Below these the table claims a response that such fields do not have. */
const lowYieldBushels = 100;
const respondsUpTo = 24_000;

type TableOriginProps = { basis: ReplantBasis; units: UnitSystem; today: string };

/** How old the yield table is and where it comes from, with what it does not know of this field. */
export function TableOrigin({ basis, units, today }: TableOriginProps) {
  const texts = replantTexts.rests;
  const { answer } = basis;
  const age = countText(Number(today.slice(0, 4)) - publishedIn, 'year');
  const value = answer.kind === 'value' ? answer : null;
  const isExtrapolated =
    value !== null && (value.keepReading.extrapolatedInSource || value.replantReading.extrapolatedInSource);
  const isLow =
    value !== null &&
    value.terms.maximumYieldBushelsPerAcre < lowYieldBushels &&
    Math.max(value.terms.replantPlantsPerAcre, basis.stand?.plantsPerAcre ?? 0) > respondsUpTo;
  return (
    <div className="flex max-w-reading flex-col gap-1">
      <h3 className="text-15">{texts.table}</h3>
      <p>{texts.tableOrigin(age)}</p>
      {isExtrapolated ? <p>{texts.tableExtrapolated}</p> : null}
      {isLow ? (
        <p>
          {texts.lowYield(
            yieldText(lowYieldBushels, units),
            plantsPerAreaText(respondsUpTo, units, { nearest: 100 }),
          )}
        </p>
      ) : null}
    </div>
  );
}
