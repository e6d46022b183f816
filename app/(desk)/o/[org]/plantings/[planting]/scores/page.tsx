import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query';
import type { Metadata } from 'next';
import { ScoresView } from '@/components/scores/scores-view';
import { scoresQuery } from '@/lib/client/queries/scores-query';
import { scoreLevels } from '@/lib/schemas/scores';
import { readPage } from '@/lib/server/http/read-page';
import { readScores } from '@/lib/server/services/scores/read-scores';
import { scoreTexts } from '@/lib/texts/score-texts';

export const metadata: Metadata = { title: scoreTexts.title };

type ScoresPageProps = {
  params: Promise<{ org: string; planting: string }>;
  searchParams: Promise<{ level?: string | string[] }>;
};

/** Fills the query cache that the view reads and renews, so that the first sight is complete. */
export default async function ScoresPage({ params, searchParams }: ScoresPageProps) {
  const { org, planting } = await params;
  const asked = (await searchParams).level;
  const level = scoreLevels.find((each) => each === asked) ?? 'planting';
  const { data } = await readPage(org, 'scores.read', (context) => readScores(context, { planting, level }));
  const queries = new QueryClient();
  queries.setQueryData(scoresQuery(org, planting, level).queryKey, data);
  return (
    <HydrationBoundary state={dehydrate(queries)}>
      <ScoresView plantingId={planting} />
    </HydrationBoundary>
  );
}
