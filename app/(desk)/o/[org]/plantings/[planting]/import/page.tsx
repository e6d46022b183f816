import type { Metadata } from 'next';
import Link from 'next/link';
import { EarlierFiles } from '@/components/import/earlier-files';
import { ImportForm } from '@/components/import/import-form';
import { PageHead } from '@/components/shell/page-head';
import { Section } from '@/components/ui/section';
import { paths } from '@/lib/paths/paths';
import { readPage } from '@/lib/server/http/read-page';
import { readImports } from '@/lib/server/services/imports/read-imports';
import { countTexts } from '@/lib/texts/count-texts';
import { importTexts } from '@/lib/texts/import-texts';

export const metadata: Metadata = { title: importTexts.title };

export default async function Page({ params }: { params: Promise<{ org: string; planting: string }> }) {
  const { org, planting } = await params;
  const { data } = await readPage(org, 'imports.write', (context) => readImports(context, planting));
  return (
    <>
      <PageHead
        kicker={<Link href={paths.count(org, planting)}>{countTexts.allRows}</Link>}
        title={importTexts.title}
        sub={importTexts.lead}
      />
      <ImportForm plantingId={planting} labels={data.labels} exampleDays={data.exampleDays} />
      <div className="pt-8">
        <Section title={importTexts.earlier}>
          <EarlierFiles files={data.files} timeZone={data.timeZone} />
        </Section>
      </div>
    </>
  );
}
