import type { Metadata } from 'next';
import { KeptFileReader } from '@/components/kept-file/kept-file-reader';
import { PageHead } from '@/components/shell/page-head';
import { readPage } from '@/lib/server/http/read-page';
import { keptFileTexts } from '@/lib/texts/kept-file-texts';

export const metadata: Metadata = { title: keptFileTexts.title };

export default async function KeptFilePage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  const { organisation } = await readPage(org, 'kept-files.read-in', async () => undefined);
  return (
    <>
      <PageHead title={keptFileTexts.title} kicker={organisation.name} sub={keptFileTexts.lead} />
      <KeptFileReader org={org} />
    </>
  );
}
