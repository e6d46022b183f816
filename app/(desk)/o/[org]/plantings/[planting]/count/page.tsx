import type { Metadata } from 'next';
import { CountPage } from '@/components/count/count-page';
import { readPage } from '@/lib/server/http/read-page';
import { readCountTable } from '@/lib/server/services/counts/read-count-table';
import { countTexts } from '@/lib/texts/count-texts';

export const metadata: Metadata = { title: countTexts.title };

export default async function Page({ params }: { params: Promise<{ org: string; planting: string }> }) {
  const { org, planting } = await params;
  const { data } = await readPage(org, 'observations.read', (context) => readCountTable(context, planting));
  return <CountPage org={org} plantingId={planting} table={data} />;
}
