import { scaleLinear } from 'd3-scale';
import { useId } from 'react';
import { decimalText } from '@/lib/format/decimal-text';

export type TurningTapeProps = {
  /** From where to where the tape runs, in the unit shown. */
  from: number;
  to: number;
  /** What was counted, with its interval; equal ends where there is none. */
  value: { at: number; lower: number; upper: number; text: string };
  /** Where the answer turns. */
  turn: { at: number; text: string };
};

const height = 128;
const tapeTop = 44;
const tapeHeight = 30;
const thousand = 1000;
const percent = (share: number) => `${share.toFixed(2)}%`;

/**
 * A tape of stands with the count above it and the turn of the answer below: on which side the count lies, and whether its
 * interval reaches across. Everything on it stands in words beside it. Numerals are thousands.
 */
export function TurningTape({ from, to, value, turn }: TurningTapeProps) {
  const x = scaleLinear().domain([from, to]).range([0, 100]);
  const turnShare = x(turn.at);
  const valueShare = x(value.at);
  // No numeral under the line of the turn, nor cut off at an end.
  const numerals = x
    .ticks(6)
    .filter((mark) => x(mark) > 3 && x(mark) < 97 && Math.abs(x(mark) - turnShare) > 3.5);
  return (
    <svg aria-hidden="true" width="100%" height={height} className="block overflow-visible">
      <text
        x={percent(valueShare)}
        y={14}
        textAnchor={anchorAt(valueShare)}
        className="fill-ink text-13 font-bold"
      >
        {value.text}
      </text>
      <g className="stroke-ink" strokeWidth={2}>
        <line x1={percent(x(value.lower))} x2={percent(x(value.upper))} y1={30} y2={30} />
        <line x1={percent(x(value.lower))} x2={percent(x(value.lower))} y1={24} y2={36} />
        <line x1={percent(x(value.upper))} x2={percent(x(value.upper))} y1={24} y2={36} />
      </g>
      <circle cx={percent(valueShare)} cy={30} r={5} className="fill-ink" />
      <rect x={0} y={tapeTop} width="100%" height={tapeHeight} className="fill-bone" />
      <g className="stroke-ink">
        <line x1={0} x2="100%" y1={tapeTop} y2={tapeTop} strokeWidth={2} />
        <line x1={0} x2="100%" y1={tapeTop + tapeHeight} y2={tapeTop + tapeHeight} strokeWidth={2} />
        {x.ticks(14).map((mark) => (
          <line key={mark} x1={percent(x(mark))} x2={percent(x(mark))} y1={tapeTop} y2={tapeTop + 7} />
        ))}
      </g>
      {numerals.map((mark) => (
        <text
          key={mark}
          x={percent(x(mark))}
          y={tapeTop + 23}
          textAnchor="middle"
          className="fill-tape-red font-mono text-13 font-bold"
        >
          {decimalText(mark / thousand, 0)}
        </text>
      ))}
      <Sides turnShare={turnShare} />
      {(['stroke-paper', 'stroke-flag'] as const).map((stroke) => (
        <line
          key={stroke}
          x1={percent(turnShare)}
          x2={percent(turnShare)}
          y1={tapeTop - 4}
          y2={tapeTop + tapeHeight + 22}
          strokeWidth={stroke === 'stroke-paper' ? 6 : 3}
          className={stroke}
        />
      ))}
      <text
        x={percent(turnShare)}
        y={height - 8}
        textAnchor={anchorAt(turnShare)}
        className="fill-flag-text text-13 font-bold"
      >
        {turn.text}
      </text>
    </svg>
  );
}

/** The two sides of the turn, in the looks of the two bars: hatched on the left, solid on the right. */
function Sides({ turnShare }: { turnShare: number }) {
  const hatchId = useId();
  const top = tapeTop + tapeHeight + 8;
  return (
    <>
      <defs>
        <pattern
          id={hatchId}
          width={7}
          height={7}
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width={7} height={7} className="fill-paper" />
          <rect width={3} height={7} className="fill-series-3" />
        </pattern>
      </defs>
      <rect x={0} y={top} width={percent(turnShare)} height={10} fill={`url(#${hatchId})`} />
      <rect
        x={percent(turnShare)}
        y={top}
        width={percent(100 - turnShare)}
        height={10}
        className="fill-series-2"
      />
    </>
  );
}

/** A label near an edge leans inward. */
function anchorAt(share: number): 'start' | 'middle' | 'end' {
  if (share < 30) return 'start';
  return share > 70 ? 'end' : 'middle';
}
