'use client';

import { TapeRow } from '@/components/tape/tape-row';
import { Button } from '@/components/ui/button';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import type { TapeLaid } from '@/lib/schemas/tape-laid';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';
import type { RowSheetData, SheetTape } from '../count/row-sheet-types';
import { TakeBack } from '../count/take-back';
import { drawnPlants } from './drawn-plants';
import { SpacingFigures } from './spacing-figures';

type StandingTapeSheetProps = { data: RowSheetData; sheet: SheetTape; onCorrect: () => void };

/** What is not as every sheet is read: from the start mark, in one piece. */
function laidWords({ readFrom, zeroAt, segmentStarts }: TapeLaid): string[] {
  return [
    ...(readFrom === 'far-end' ? [tapeSheetTexts.fromFarEnd] : []),
    ...(zeroAt === 'plant' ? [tapeSheetTexts.zeroAtPlant] : []),
    ...(segmentStarts.length > 0 ? [tapeSheetTexts.inPieces(segmentStarts.length + 1)] : []),
  ];
}

/** A tape sheet that stands: the row as it was read, and its spacing. */
export function StandingTapeSheet({ data, sheet, onCorrect }: StandingTapeSheetProps) {
  const { units } = useWho();
  const { row, counts, plantedOn, mayWrite } = data;
  const plants = sheet.places.filter((place) => place.kind !== 'missing');
  const date = dateText(sheet.visitedOn);
  return (
    <div className="flex flex-col gap-4 border-b border-rule pb-4">
      <div className="flex flex-wrap items-center justify-between gap-x-4">
        <p className="text-18">
          {tapeSheetTexts.readBy(date, String(daysAfter(plantedOn, sheet.visitedOn)), sheet.personName)}
          {sheet.used ? '' : `. ${tapeSheetTexts.older}`}
        </p>
        {mayWrite ? (
          <div className="flex flex-wrap gap-1">
            <Button look="quiet" aria-label={tapeSheetTexts.correctOf(date)} onClick={onCorrect}>
              {tapeSheetTexts.correct}
            </Button>
            <TakeBack targetKind="tape-sheet" targetId={sheet.id} what={tapeSheetTexts.sheetOf(date, countText(plants.length, 'plant'))} />
          </div>
        ) : null}
      </div>
      {laidWords(sheet.laid).map((sentence) => (
        <p key={sentence}>{sentence}</p>
      ))}
      <TapeRow
        lengthInches={row.lengthInches}
        plants={drawnPlants(sheet.places.map((place) => ({ ...place, seenBy: place.firstSeen?.by ?? null })), counts)}
        units={units}
        startEnd={row.startEnd}
        farEnd={row.farEnd}
        orientation="horizontal"
        label={tapeSheetTexts.label(row.label)}
      />
      <SpacingFigures plants={plants} units={units} />
    </div>
  );
}
