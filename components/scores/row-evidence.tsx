'use client';

import { EarlinessTape } from './earliness-tape';
import { DayBars } from '@/components/charts/day-bars';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import { daysAfter } from '@/lib/format/days-after';
import type { PlantingFacts } from '@/lib/schemas/planting-facts';
import type { ScoredRow } from '@/lib/schemas/scores';
import { scoreTexts } from '@/lib/texts/score-texts';

/** What was read in one row sample: the row on its tape, and the counts day by day. */
export function RowEvidence({ row, planting }: { row: ScoredRow; planting: PlantingFacts }) {
  const { today } = useWho();
  const seeds = row.scored?.figures.shareOfSeed;
  return (
    <>
      {row.tapeSheet && row.tapeSheet.plants.length > 0 ? (
        <Section title={scoreTexts.sections.tape}>
          <EarlinessTape
            rows={[{ id: row.rowSampleId, label: row.label, plants: row.tapeSheet.plants, lengthInches: row.length.inches, startEnd: row.startEnd, farEnd: row.farEnd }]}
          />
        </Section>
      ) : null}
      {row.counts.length > 0 ? (
        <Section title={scoreTexts.sections.counts}>
          <DayBars
            title={scoreTexts.countsTitle(row.label)}
            sample={countText(row.counts.length, 'visit')}
            uncertainty={scoreTexts.curve.uncertainty}
            fileName={`counts-${row.label}`}
            seeds={seeds?.kind === 'value' ? seeds.value.seeds : null}
            days={lastOfEachDay(row).map(({ visitedOn, plantsUp }) => ({
              daysAfterPlanting: daysAfter(planting.plantedOn, visitedOn),
              count: plantsUp,
              isToday: visitedOn === today,
            }))}
          />
        </Section>
      ) : null}
    </>
  );
}

/** A row may be visited twice a day; the bars are of days. */
function lastOfEachDay(row: ScoredRow) {
  return row.counts.filter((count, index) => row.counts[index + 1]?.visitedOn !== count.visitedOn);
}
