import { Figure } from '@/components/ui/figure';
import { NumberSource } from '@/components/ui/number-source';
import { bySegment } from '@/lib/agronomy/by-segment';
import { register } from '@/lib/agronomy/register';
import { mapOutcome } from '@/lib/agronomy/outcome';
import { spacingInchesMean, spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { countText } from '@/lib/format/count-text';
import { lengthText } from '@/lib/format/length-text';
import { outcomeText } from '@/lib/format/outcome-text';
import { spacingText } from '@/lib/format/spacing-text';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';

type SpacingFiguresProps = {
  /** Where plants stand, in any order within a piece of the tape; missing ones are not among them. */
  plants: readonly { positionInches: number; segment: number }[];
  units: UnitSystem;
};

/** How many plants a sheet has, how far apart they stand and how evenly; made anew with every place typed. */
export function SpacingFigures({ plants, units }: SpacingFiguresProps) {
  const pieces = bySegment(
    [...plants].sort((a, b) => a.segment - b.segment || a.positionInches - b.positionInches),
    (plant) => plant.segment,
  ).map((piece) => piece.map((plant) => plant.positionInches));
  const inOrder = pieces.flat();
  const spacings = pieces.flatMap(spacingsInches);
  const mean = spacingInchesMean(spacings);
  const sd = mapOutcome(spacingVariation(spacings), (variation) => variation.spacingInchesSd);
  const inputs = [
    { name: tapeSheetTexts.sheetInputs.readings, text: inOrder.map((inches) => lengthText(inches, units, { withUnit: false })).join(' ') },
    { name: tapeSheetTexts.sheetInputs.spacings, text: spacings.map((inches) => spacingText(inches, units, { withUnit: false })).join(' ') },
  ];
  const figures = [
    { id: 'spacingInchesMean' as const, label: tapeSheetTexts.mean, outcome: mean },
    { id: 'spacingInchesSd' as const, label: tapeSheetTexts.sd, outcome: sd },
  ];
  return (
    <div className="grid grid-cols-2 gap-x-6 gap-y-4 sm:grid-cols-3" aria-live="polite">
      <Figure label={tapeSheetTexts.plants} value={<span className="font-mono">{inOrder.length}</span>} />
      {figures.map(({ id, label, outcome }) =>
        outcome.kind === 'value' ? (
          <Figure
            key={id}
            label={label}
            value={<NumberSource label={label} text={spacingText(outcome.value, units)} entry={register[id]} inputs={inputs} />}
            detail={tapeSheetTexts.meanAndSdOf(countText(spacings.length, 'spacing'))}
          />
        ) : (
          <div key={id} className="flex flex-col">
            <p className="text-15 font-bold">{label}</p>
            <p className="text-15">{outcomeText(outcome, () => '')}</p>
          </div>
        ),
      )}
    </div>
  );
}
