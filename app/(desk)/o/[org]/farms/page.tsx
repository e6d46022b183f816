import type { Metadata } from 'next';
import Link from 'next/link';
import { FarmForm } from '@/components/farm/farm-form';
import { PageHead } from '@/components/shell/page-head';
import { EmptyState } from '@/components/ui/empty-state';
import { Section } from '@/components/ui/section';
import { can } from '@/lib/access/can';
import { paths } from '@/lib/paths/paths';
import { readPage } from '@/lib/server/http/read-page';
import { readFarms } from '@/lib/server/services/farms/read-farms';
import { farmTexts } from '@/lib/texts/farm-texts';

export const metadata: Metadata = { title: farmTexts.title };

export default async function FarmsPage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  const { actor, organisation, data: farms } = await readPage(org, 'farms.read', readFarms);
  return (
    <>
      <PageHead title={farmTexts.title} />
      {farms.length === 0 ? <EmptyState title={farmTexts.none}>{farmTexts.noneHint}</EmptyState> : null}
      <ul className="flex flex-col gap-2 pb-8">
        {farms.map((farm) => (
          <li key={farm.id}>
            <Link className="text-21" href={paths.farm(org, farm.id)}>
              {farm.name}
            </Link>
          </li>
        ))}
      </ul>
      {can(actor, 'farms.write') ? (
        <Section title={farmTexts.addTitle}>
          <FarmForm timeZone={organisation.timeZone} />
        </Section>
      ) : null}
    </>
  );
}
