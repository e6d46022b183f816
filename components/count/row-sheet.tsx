import Link from 'next/link';
import type { ReactNode } from 'react';
import { PageHead } from '@/components/shell/page-head';
import { TapeSection } from '@/components/tape-sheet/tape-section';
import { LinkButton } from '@/components/ui/link-button';
import { countText } from '@/lib/format/count-text';
import { daysAfter } from '@/lib/format/days-after';
import { readingText } from '@/lib/format/reading-text';
import { paths } from '@/lib/paths/paths';
import { countTexts } from '@/lib/texts/count-texts';
import { CountsSection } from './counts-section';
import { CoverSection } from './cover-section';
import { rowPlaceText } from './row-place-text';
import type { RowSheetData } from './row-sheet-types';

/** One row sample: what stands of it, and the paper sheet to type in. */
export function RowSheet({ org, data, children }: { org: string; data: RowSheetData; children?: ReactNode }) {
  const { row, counts, plantedOn, plantingId, previous, next } = data;
  const last = counts.findLast((count) => count.used);
  const title = last
    ? countTexts.sheetTitle(row.label, countText(last.plantsUp, 'plant'), String(daysAfter(plantedOn, last.visitedOn)))
    : data.findings.tapePlants === null
      ? countTexts.sheetTitleNone(row.label)
      : countTexts.sheetTitleTape(row.label, countText(data.findings.tapePlants, 'plant'));
  return (
    <div data-place="field">
      <PageHead
        kicker={<Link className="inline-flex min-h-press items-center text-15 underline underline-offset-4" href={paths.count(org, plantingId)}>{countTexts.allRows}</Link>}
        title={title}
        sub={[`${rowPlaceText(row.place)}.`, countTexts.lengthAndSeeds(readingText(row.length), countText(Math.round(row.seeds), 'seed')), countingSentence(data)].join(' ')}
        actions={
          <>
            {previous ? <LinkButton look="secondary" href={paths.rowSample(org, plantingId, previous.id)}>{countTexts.previous(previous.label)}</LinkButton> : null}
            {next ? <LinkButton look="secondary" href={paths.rowSample(org, plantingId, next.id)}>{countTexts.next(next.label)}</LinkButton> : null}
          </>
        }
      />
      <CountsSection data={data} />
      <TapeSection data={data} />
      <CoverSection data={data} />
      {children}
    </div>
  );
}

function countingSentence({ counts, findings }: RowSheetData): string {
  if (counts.length === 0) return '';
  return findings.countingEnded ? countTexts.rowEnded : countTexts.rowStillComing;
}
