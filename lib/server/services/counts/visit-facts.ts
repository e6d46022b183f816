import 'server-only';
import type { PlantingRow } from '../../data/planting';
import type { WriteContext } from '../../operations/context';
import type { VisitFacts } from './check-visit';

/** What a visit of this planting is held against. A field phone's entry of a day to come is taken and looked at later; a form's is not. */
export function visitFacts({ clock, originKind }: WriteContext, planting: PlantingRow, timeZone: string): VisitFacts {
  return {
    plantedOn: planting.plantedOn,
    plantedAt: planting.plantedAt,
    today: originKind === 'form' || originKind === 'import' ? clock.today(timeZone) : null,
  };
}
