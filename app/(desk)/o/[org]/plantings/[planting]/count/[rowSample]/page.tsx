import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { RowSheet } from '@/components/count/row-sheet';
import { RowRecords } from '@/components/field-record/row-records';
import { readPage } from '@/lib/server/http/read-page';
import { readRowSheet } from '@/lib/server/services/counts/read-row-sheet';
import { readRowRecords } from '@/lib/server/services/field-records/read-row-records';
import { countTexts } from '@/lib/texts/count-texts';

export const metadata: Metadata = { title: countTexts.title };

type PageProps = { params: Promise<{ org: string; planting: string; rowSample: string }> };

export default async function Page({ params }: PageProps) {
  const { org, planting, rowSample } = await params;
  if (!z.uuid().safeParse(rowSample).success) notFound();
  const { data } = await readPage(org, 'observations.read', async (context) => ({
    sheet: await readRowSheet(context, planting, rowSample),
    records: await readRowRecords(context, planting, rowSample),
  }));
  return (
    <RowSheet key={rowSample} org={org} data={data.sheet}>
      <RowRecords records={data.records} />
    </RowSheet>
  );
}
