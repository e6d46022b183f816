import { spreadLabels } from '@/components/ui/spread-labels';
import { lengthText } from '@/lib/format/length-text';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import type { TapeDouble } from './tape-doubles';
import type { TapeGap } from './tape-gaps';

type UprightNotesProps = {
  x: number;
  yOf: (inches: number) => number;
  height: number;
  gaps: readonly TapeGap[];
  doubles: readonly TapeDouble[];
  units: UnitSystem;
};

const lineDistance = 17;

/** Right of an upright tape: brackets, with the length of each gap and each double. */
export function UprightNotes({ x, yOf, height, gaps, doubles, units }: UprightNotesProps) {
  const texts = interfaceTexts.tape;
  const notes = [
    ...gaps.map((gap) => ({ ...gap, text: texts.gap(lengthText(gap.toInches - gap.fromInches, units)) })),
    ...doubles.map((double) => ({
      ...double,
      text:
        double.toInches > double.fromInches
          ? `${texts.double} ${lengthText(double.toInches - double.fromInches, units)}`
          : texts.double,
    })),
  ];
  const middles = notes.map((note) => (yOf(note.fromInches) + yOf(note.toInches)) / 2);
  const lines = spreadLabels(
    middles,
    notes.map(() => lineDistance),
    0,
    height,
  );
  return notes.map((note, index) => {
    const middle = middles[index] ?? 0;
    const line = lines[index] ?? 0;
    const [bottom, top] =
      note.fromInches === note.toInches
        ? [middle + 4, middle - 4]
        : [yOf(note.fromInches), yOf(note.toInches)];
    return (
      <g key={`${note.text} ${note.fromInches}`}>
        <path
          d={`M${x + 5} ${top.toFixed(1)}h6V${bottom.toFixed(1)}h-6M${x + 11} ${middle.toFixed(1)}L${x + 19} ${line.toFixed(1)}`}
          fill="none"
          strokeWidth={1.4}
          className="stroke-ink"
        />
        <text x={x + 23} y={(line + 4.5).toFixed(1)} fontSize={14} className="fill-ink font-mono">
          {note.text}
        </text>
      </g>
    );
  });
}
