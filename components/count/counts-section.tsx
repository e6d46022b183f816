'use client';

import { DayBars } from '@/components/charts/day-bars';
import { Section } from '@/components/ui/section';
import { countText } from '@/lib/format/count-text';
import { daysAfter } from '@/lib/format/days-after';
import { countTexts } from '@/lib/texts/count-texts';
import { CountEntry, focusLine } from './count-entry';
import type { RowSheetData, SheetCount } from './row-sheet-types';
import { StandingCounts } from './standing-counts';
import { useCountSheet } from './use-count-sheet';

/** What was counted in a row sample, and the sheet to add to it. */
export function CountsSection({ data }: { data: RowSheetData }) {
  const { row, counts, plantedOn, today, me } = data;
  const sheet = useCountSheet({ rowSampleId: row.id, today, me });
  const correct = (count: SheetCount, said: string) => focusLine(sheet.correct(count, said));
  return (
    <>
      {data.mayWrite ? (
        <Section title={countTexts.enterSection} lead={countTexts.enterLead}>
          <CountEntry sheet={sheet} people={data.people} />
        </Section>
      ) : null}
      <Section title={countTexts.countsSection}>
        <div className="grid items-start gap-8 lg:grid-cols-2">
          <StandingCounts counts={counts} plantedOn={plantedOn} fallingOn={data.findings.fallingOn} datedAheadOn={data.findings.datedAheadOn} mayWrite={data.mayWrite} onCorrect={correct} />
          {counts.length > 0 ? (
            <DayBars
              title={countTexts.chartTitle(row.label)}
              sample={countTexts.chartSample(countText(daysCounted(counts), 'day'))}
              uncertainty={countTexts.chartUncertainty}
              fileName={`${row.label}-counts`}
              seeds={row.seeds}
              days={dayCounts(counts).map(([day, count]) => ({ daysAfterPlanting: daysAfter(plantedOn, day), count, isToday: day === today }))}
            />
          ) : null}
        </div>
      </Section>
    </>
  );
}

/** The last used count of each day, by day. */
function dayCounts(counts: readonly SheetCount[]): [string, number][] {
  return [...new Map(counts.filter((count) => count.used).map((count) => [count.visitedOn, count.plantsUp]))];
}

const daysCounted = (counts: readonly SheetCount[]) => dayCounts(counts).length;
