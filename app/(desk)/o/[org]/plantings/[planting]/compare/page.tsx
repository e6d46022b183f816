import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query';
import type { Metadata } from 'next';
import { ComparisonView } from '@/components/comparison/comparison-view';
import { comparisonQuery } from '@/lib/client/queries/comparison-query';
import { readPage } from '@/lib/server/http/read-page';
import { readComparison } from '@/lib/server/services/comparison/read-comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';

export const metadata: Metadata = { title: comparisonTexts.title };

/** Fills the query cache that the view reads and renews, so that the first sight is complete. */
export default async function ComparePage({ params }: { params: Promise<{ org: string; planting: string }> }) {
  const { org, planting } = await params;
  const { data } = await readPage(org, 'comparison.read', (context) => readComparison(context, { planting }));
  const queries = new QueryClient();
  queries.setQueryData(comparisonQuery(org, planting).queryKey, data);
  return (
    <HydrationBoundary state={dehydrate(queries)}>
      <ComparisonView plantingId={planting} />
    </HydrationBoundary>
  );
}
