import { TurningTape } from '@/components/charts/turning-tape';
import { NAFZIGER_STAND_HIGHEST, NAFZIGER_STAND_LOWEST } from '@/lib/agronomy/replant-table-nafziger';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { shownInUnits } from '@/lib/format/shown-in-units';
import type { ReplantBasis } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { replantTexts } from '@/lib/texts/replant-texts';

type TurningStandProps = {
  stand: NonNullable<ReplantBasis['stand']>;
  breakEven: { plantsPerAcre: number; text: string };
  units: UnitSystem;
};

/** Room below the lowest stand of the table, so that its edge is not the edge of the tape. */
const roomPlantsPerAcre = 2_000;

/** The count beside the break-even stand, on a tape of the stands that the table holds. */
export function TurningStand({ stand, breakEven, units }: TurningStandProps) {
  const texts = replantTexts.breakEven;
  const { plantsPerAcre, interval } = stand;
  const lower = interval?.lower ?? plantsPerAcre;
  const upper = interval?.upper ?? plantsPerAcre;
  const least = Math.min(NAFZIGER_STAND_LOWEST, lower, breakEven.plantsPerAcre) - roomPlantsPerAcre;
  const shown = (plants: number) => shownInUnits(plants, 'plants-per-area', units);
  return (
    <div>
      <TurningTape
        from={shown(Math.max(0, least))}
        to={shown(Math.max(NAFZIGER_STAND_HIGHEST, upper))}
        value={{
          at: shown(plantsPerAcre),
          lower: shown(lower),
          upper: shown(upper),
          text: texts.thisStand(plantsPerAreaText(plantsPerAcre, units, { nearest: 100, withUnit: false })),
        }}
        turn={{ at: shown(breakEven.plantsPerAcre), text: texts.turnsAt(breakEven.text) }}
      />
      <p className="text-13 text-ink-soft">
        {texts.scaleNote(interfaceTexts.charts.thousandPlants(units), interval !== null)}
      </p>
    </div>
  );
}
