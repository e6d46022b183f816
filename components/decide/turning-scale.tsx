import { scaleLinear } from 'd3-scale';
import { useId } from 'react';
import { NAFZIGER_STAND_HIGHEST, NAFZIGER_STAND_LOWEST } from '@/lib/agronomy/replant-table-nafziger';
import { decimalText } from '@/lib/format/decimal-text';
import { shownInUnits } from '@/lib/format/shown-in-units';
import type { ReplantBasis } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';

type TurningScaleProps = {
  breakEvenPlantsPerAcre: number;
  breakEvenText: string;
  stand: NonNullable<ReplantBasis['stand']>;
  standText: string;
  units: UnitSystem;
};

const height = 128;
const tapeTop = 44;
const tapeHeight = 30;
const thousand = 1000;

/**
 * The stands of the table as a tape, with the count above it and the break-even below: on which side of it the count lies,
 * and whether its interval reaches across. Everything on it stands in words beside it.
 */
export function TurningScale({ breakEvenPlantsPerAcre, breakEvenText, stand, standText, units }: TurningScaleProps) {
  const texts = replantTexts.breakEven;
  const shown = (plantsPerAcre: number) => shownInUnits(plantsPerAcre, 'plants-per-area', units);
  const { lower, upper } = stand.interval ?? { lower: stand.plantsPerAcre, upper: stand.plantsPerAcre };
  const least = Math.min(NAFZIGER_STAND_LOWEST, lower, breakEvenPlantsPerAcre) - 2 * thousand;
  const most = Math.max(NAFZIGER_STAND_HIGHEST, upper, breakEvenPlantsPerAcre);
  const x = scaleLinear().domain([shown(Math.max(0, least)), shown(most)]).range([0, 100]);
  const at = (plantsPerAcre: number) => `${x(shown(plantsPerAcre)).toFixed(2)}%`;
  const share = x(shown(breakEvenPlantsPerAcre));
  const standShare = x(shown(stand.plantsPerAcre));
  const marks = x.ticks(units === 'us' ? 14 : 16);
  // No numeral under the break-even line, nor cut off at an end.
  const numerals = x.ticks(6).filter((each) => x(each) > 3 && x(each) < 97 && Math.abs(x(each) - share) > 3.5);
  return (
    <svg aria-hidden="true" width="100%" height={height} className="block overflow-visible">
      <text x={`${standShare.toFixed(2)}%`} y={14} textAnchor={anchorAt(standShare)} className="fill-ink text-13 font-bold">
        {texts.thisStand(standText)}
      </text>
      <g className="stroke-ink" strokeWidth={2}>
        <line x1={at(lower)} x2={at(upper)} y1={30} y2={30} />
        <line x1={at(lower)} x2={at(lower)} y1={24} y2={36} />
        <line x1={at(upper)} x2={at(upper)} y1={24} y2={36} />
      </g>
      <circle cx={at(stand.plantsPerAcre)} cy={30} r={5} className="fill-ink" />
      <rect x={0} y={tapeTop} width="100%" height={tapeHeight} className="fill-bone" />
      <g className="stroke-ink">
        <line x1={0} x2="100%" y1={tapeTop} y2={tapeTop} strokeWidth={2} />
        <line x1={0} x2="100%" y1={tapeTop + tapeHeight} y2={tapeTop + tapeHeight} strokeWidth={2} />
        {marks.map((mark) => (
          <line key={mark} x1={`${x(mark).toFixed(2)}%`} x2={`${x(mark).toFixed(2)}%`} y1={tapeTop} y2={tapeTop + 7} />
        ))}
      </g>
      {numerals.map((mark) => (
        <text key={mark} x={`${x(mark).toFixed(2)}%`} y={tapeTop + 23} textAnchor="middle" className="fill-tape-red font-mono text-13 font-bold">
          {decimalText(mark / thousand, 0)}
        </text>
      ))}
      <Sides share={share} />
      <line x1={`${share.toFixed(2)}%`} x2={`${share.toFixed(2)}%`} y1={tapeTop - 4} y2={tapeTop + tapeHeight + 22} strokeWidth={6} className="stroke-paper" />
      <line x1={`${share.toFixed(2)}%`} x2={`${share.toFixed(2)}%`} y1={tapeTop - 4} y2={tapeTop + tapeHeight + 22} strokeWidth={3} className="stroke-flag" />
      <text x={`${share.toFixed(2)}%`} y={height - 8} textAnchor={anchorAt(share)} className="fill-flag-text text-13 font-bold">
        {breakEvenText}
      </text>
    </svg>
  );
}

/** Left of the break-even replanting earns more, right of it keeping: in the looks of the two bars above. */
function Sides({ share }: { share: number }) {
  const hatchId = useId();
  const top = tapeTop + tapeHeight + 8;
  return (
    <>
      <defs>
        <pattern id={hatchId} width={7} height={7} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <rect width={7} height={7} className="fill-paper" />
          <rect width={3} height={7} className="fill-series-3" />
        </pattern>
      </defs>
      <rect x={0} y={top} width={`${share.toFixed(2)}%`} height={10} fill={`url(#${hatchId})`} />
      <rect x={`${share.toFixed(2)}%`} y={top} width={`${(100 - share).toFixed(2)}%`} height={10} className="fill-series-2" />
    </>
  );
}

/** A label near an edge leans inward. */
function anchorAt(share: number): 'start' | 'middle' | 'end' {
  if (share < 30) return 'start';
  return share > 70 ? 'end' : 'middle';
}
