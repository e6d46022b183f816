'use client';

import { TapeLegend } from '@/components/tape/tape-legend';
import { TapeRow } from '@/components/tape/tape-row';
import { useWho } from '@/lib/client/who';
import { daysText } from '@/lib/format/days-text';
import type { DrawnPlant } from '@/lib/schemas/drawn-plant';
import type { RowEnd } from '@/lib/schemas/vocabulary';
import { scoreTexts } from '@/lib/texts/score-texts';
import { earlinessScale } from './earliness-scale';

export type DrawnRow = {
  id: string;
  label: string;
  plants: readonly DrawnPlant[];
  lengthInches: number;
  startEnd: RowEnd;
  farEnd: RowEnd;
};

/** Rows drawn on one scale of earliness, so that a short plant in one is as late as a short plant in another. */
export function EarlinessTape({ rows, head }: { rows: readonly DrawnRow[]; head?: (id: string) => React.ReactNode }) {
  const { units } = useWho();
  const scale = earlinessScale(rows.flatMap((row) => row.plants));
  return (
    <div className="flex flex-col gap-4">
      <ul className="flex flex-col">
        {rows.map((row) => (
          <li key={row.id} className={head ? 'grid gap-x-6 gap-y-1 border-b border-rule py-3 first:border-t lg:grid-cols-[13rem_1fr] lg:items-center' : ''}>
            {head ? head(row.id) : null}
            <TapeRow
              lengthInches={row.lengthInches}
              plants={row.plants.map((plant) => ({
                positionInches: plant.positionInches,
                segment: plant.segment,
                earliness: plant.days === null ? null : scale.earliness(plant.days),
                late: plant.late,
                double: plant.double,
                kind: plant.kind,
              }))}
              units={units}
              startEnd={row.startEnd}
              farEnd={row.farEnd}
              orientation="horizontal"
              label={row.label}
            />
          </li>
        ))}
      </ul>
      {scale.firstDays === null || scale.lastDays === null ? null : (
        <p className="text-13 text-ink-soft">
          {scoreTexts.tapeHeights(daysText(scale.firstDays, { withUnit: false }), daysText(scale.lastDays, { withUnit: false }))}
        </p>
      )}
      <TapeLegend />
    </div>
  );
}
