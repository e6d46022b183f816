'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'next/navigation';
import { PageHead } from '@/components/shell/page-head';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/section';
import { Skeleton } from '@/components/ui/skeleton';
import { scoresQuery } from '@/lib/client/queries/scores-query';
import { useWho } from '@/lib/client/who';
import { paths } from '@/lib/paths/paths';
import { scoreLevels, type ScoreLevel } from '@/lib/schemas/scores';
import { scoreTexts } from '@/lib/texts/score-texts';
import { LevelTabs } from './level-tabs';
import { ScoreNotes } from './score-notes';
import { scoredThings } from './scored-things';
import { scoresFinding } from './scores-finding';
import { ThingDetail } from './thing-detail';
import { ThingsOfLevel } from './things-of-level';
import { ZoneTable } from './zone-table';

/** The scores of a planting: the finding first, then a level of one's choice, then everything about one thing. */
export function ScoresView({ plantingId }: { plantingId: string }) {
  const { organisationId, units } = useWho();
  const search = useSearchParams();
  const level = levelIn(search.get('level'));
  const { data: scores, error } = useQuery({
    ...scoresQuery(organisationId, plantingId, level),
    placeholderData: keepPreviousData,
  });
  if (!scores) return error ? <Notice title={error.message}>{scoreTexts.tryAgain}</Notice> : <Skeleton label={scoreTexts.reading} lines={6} />;

  const { headline, details } = scoresFinding(scores, units);
  const here = paths.scores(organisationId, plantingId);
  const hasAny = scores.whole.pooled.rowSamples > 0;
  const things = scoredThings(scores, level);
  return (
    <>
      <PageHead title={headline} sub={details.map((sentence) => <p key={sentence}>{sentence}</p>)} />
      {error ? <Notice>{scoreTexts.notRenewed(error.message)}</Notice> : null}
      <ScoreNotes scores={scores} />
      {hasAny ? (
        <>
          <LevelTabs here={here} level={level} things={scores.things} />
          <div className="pt-6">
            {level === 'planting' ? (
              <>
                <ThingDetail subject={{ planting: scores.planting, ...scores.whole, row: null }} name={scores.planting.fieldName} />
                {scores.zoneStand ? (
                  <Section title={scoreTexts.sections.zones}>
                    <ZoneTable scores={scores} />
                  </Section>
                ) : null}
              </>
            ) : scores.level === level ? (
              <ThingsOfLevel here={here} level={level} things={things} planting={scores.planting} opened={search.get('open')} />
            ) : (
              <Skeleton label={scoreTexts.reading} lines={8} />
            )}
          </div>
        </>
      ) : (
        <EmptyState title={scoreTexts.emptyTitle} action={<LinkButton href={paths.count(organisationId, plantingId)}>{scoreTexts.toCount}</LinkButton>}>
          {scoreTexts.nothingHint}
        </EmptyState>
      )}
    </>
  );
}

/** A level in the address that is none is the planting. */
export function levelIn(asked: string | null): ScoreLevel {
  return scoreLevels.find((level) => level === asked) ?? 'planting';
}
