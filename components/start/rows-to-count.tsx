import Link from 'next/link';
import { paths } from '@/lib/paths/paths';
import { startTexts } from '@/lib/texts/start-texts';

type RowsToCountProps = {
  org: string;
  plantings: readonly {
    plantingId: string;
    fieldName: string;
    farmName: string;
    rows: readonly { id: string; label: string; visited: boolean }[];
  }[];
};

/** For a scout: every row sample by its peg's label, large enough for a thumb. */
export function RowsToCount({ org, plantings }: RowsToCountProps) {
  return (
    <div data-place="field" className="flex flex-col gap-8">
      {plantings
        .filter((planting) => planting.rows.length > 0)
        .map((planting) => (
          <section key={planting.plantingId} className="border-t-2 border-ink pt-3">
            <h2 className="text-21">
              {planting.farmName}, {planting.fieldName}
            </h2>
            <p className="pb-2">
              <Link className="flex min-h-press items-center font-bold" href={paths.count(org, planting.plantingId)}>
                {startTexts.allCounts}
              </Link>
            </p>
            <ul className="grid grid-cols-3 gap-2 sm:grid-cols-6 lg:grid-cols-8">
              {planting.rows.map((row) => (
                <li key={row.id}>
                  <Link
                    href={paths.rowSample(org, planting.plantingId, row.id)}
                    className="flex min-h-14 flex-col items-center justify-center rounded-press border-2 border-ink px-1 text-center font-mono text-18 font-bold text-ink no-underline hover:bg-bone"
                  >
                    {row.label}
                    {row.visited ? null : <span className="font-sans text-13 font-normal">{startTexts.notCounted}</span>}
                  </Link>
                </li>
              ))}
            </ul>
          </section>
        ))}
    </div>
  );
}
