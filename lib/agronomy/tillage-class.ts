import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

export type TillageClass = 'conservation' | 'reduced' | 'conventional';

/** Where the marks were read: along a line over the rows, or along the seed row. */
export type CoverPlace = 'field' | 'in-row';

export type TillageClasses = {
  tillageClass: TillageClass;
  /** Every class the interval reaches, most cover first; one alone means the reading settles it. */
  within: TillageClass[];
};

const CONSERVATION_PERCENT = 30;
const REDUCED_PERCENT = 15;

function classOf(percent: number): TillageClass {
  if (percent >= CONSERVATION_PERCENT) return 'conservation';
  return percent >= REDUCED_PERCENT ? 'reduced' : 'conventional';
}

/**
 * Which class of tillage does the cover after planting make, and could another be right?
 *
 * Takes cover in percent (0 to 100), the ends of its interval (lower not above upper; both equal to the cover where there
 * is none) and where the marks were read. Returns the class and all classes the interval reaches. Insufficient for cover
 * read along the seed row. Throws ImpossibleInput outside 0 to 100 and for ends on the wrong side of the cover.
 * Method: 30 % and more conservation, 15 to below 30 % reduced (extension services, read after planting); below 15 %
 * conventional, from memory.
 * What it does not tell: how the rows themselves look, which a line over the rows hardly sees. Example: 44 %:
 * conservation.
 */
export function tillageClass(
  cover: { coverPercent: number; coverPercentLower: number; coverPercentUpper: number },
  place: CoverPlace,
): Outcome<TillageClasses> {
  const { coverPercent, coverPercentLower, coverPercentUpper } = cover;
  requiredNumber(coverPercent, 'coverPercent', { atLeast: 0, atMost: 100 });
  requiredNumber(coverPercentLower, 'coverPercentLower', { atLeast: 0, atMost: coverPercent });
  requiredNumber(coverPercentUpper, 'coverPercentUpper', { atLeast: coverPercent, atMost: 100 });
  if (place === 'in-row') {
    return insufficient('in-row-cover', 'cover read along a line over the rows', 'cover read along the row');
  }
  const order: TillageClass[] = ['conservation', 'reduced', 'conventional'];
  const within = order.slice(
    order.indexOf(classOf(coverPercentUpper)),
    order.indexOf(classOf(coverPercentLower)) + 1,
  );
  return value({ tillageClass: classOf(coverPercent), within });
}
