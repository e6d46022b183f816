import type { Metadata } from 'next';
import { CountPage } from '@/components/count/count-page';
import { PlantingRecords } from '@/components/field-record/planting-records';
import { readPage } from '@/lib/server/http/read-page';
import { readCountTable } from '@/lib/server/services/counts/read-count-table';
import { readPlantingRecords } from '@/lib/server/services/field-records/read-planting-records';
import { countTexts } from '@/lib/texts/count-texts';

export const metadata: Metadata = { title: countTexts.title };

export default async function Page({ params }: { params: Promise<{ org: string; planting: string }> }) {
  const { org, planting } = await params;
  const { data } = await readPage(org, 'observations.read', async (context) => ({
    table: await readCountTable(context, planting),
    records: await readPlantingRecords(context, planting),
  }));
  return (
    <>
      <CountPage org={org} plantingId={planting} table={data.table} />
      <PlantingRecords org={org} plantingId={planting} records={data.records} />
    </>
  );
}
