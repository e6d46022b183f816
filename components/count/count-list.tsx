import Link from 'next/link';
import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import { paths } from '@/lib/paths/paths';
import { countTexts } from '@/lib/texts/count-texts';
import type { CountRow } from './count-table-types';
import { countingText, findingTexts } from './finding-texts';
import { rowPlaceText } from './row-place-text';

type CountListProps = { org: string; plantingId: string; plantedOn: string; rows: readonly CountRow[] };

/** The same row samples for a phone: each one press away, with its last count as large as fits. */
export function CountList({ org, plantingId, plantedOn, rows }: CountListProps) {
  return (
    <ul className="border-t border-rule" data-place="field">
      {rows.map((row) => {
        const last = row.counts.findLast((count) => count.used);
        const flags = findingTexts(row.findings);
        return (
          <li key={row.id} className="border-b border-rule">
            <Link href={paths.rowSample(org, plantingId, row.id)} className="flex min-h-press items-center justify-between gap-4 py-3 text-ink no-underline">
              <span className="flex min-w-0 flex-col">
                <span className="text-21 font-bold underline underline-offset-4">{row.label}</span>
                <span className="text-15">{rowPlaceText(row.place)}</span>
                {flags.map((flag) => (
                  <span key={flag} className="text-15 font-bold text-flag-text">
                    {flag}
                  </span>
                ))}
              </span>
              <span className="flex shrink-0 flex-col items-end text-right">
                {last ? (
                  <>
                    <span className="font-mono text-34 leading-none font-bold">{last.plantsUp}</span>
                    <span className="text-13">
                      {countTexts.visitHead(dateText(last.visitedOn, 'day-and-month'), String(daysAfter(plantedOn, last.visitedOn)))}
                    </span>
                  </>
                ) : null}
                <span className="text-13">{countingText(row.findings)}</span>
              </span>
            </Link>
          </li>
        );
      })}
    </ul>
  );
}
