import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { RowSheet } from '@/components/count/row-sheet';
import { readPage } from '@/lib/server/http/read-page';
import { readRowSheet } from '@/lib/server/services/counts/read-row-sheet';
import { countTexts } from '@/lib/texts/count-texts';

export const metadata: Metadata = { title: countTexts.title };

type PageProps = { params: Promise<{ org: string; planting: string; rowSample: string }> };

export default async function Page({ params }: PageProps) {
  const { org, planting, rowSample } = await params;
  if (!z.uuid().safeParse(rowSample).success) notFound();
  const { data } = await readPage(org, 'observations.read', (context) => readRowSheet(context, planting, rowSample));
  return <RowSheet key={rowSample} org={org} data={data} />;
}
