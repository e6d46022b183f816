import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query';
import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { Decide } from '@/components/decide/decide';
import { can } from '@/lib/access/can';
import { replantQuery } from '@/lib/client/queries/replant-query';
import { readPage } from '@/lib/server/http/read-page';
import { readReplant } from '@/lib/server/services/replant/read-replant';
import { replantTexts } from '@/lib/texts/replant-texts';

export const metadata: Metadata = { title: replantTexts.title };

type DecidePageProps = {
  params: Promise<{ org: string; planting: string }>;
  searchParams: Promise<{ zone?: string | string[] }>;
};

const addressSchema = z.object({ planting: z.uuid(), zone: z.uuid().nullable() });

export default async function DecidePage({ params, searchParams }: DecidePageProps) {
  const { org, planting } = await params;
  const { zone = null } = await searchParams;
  const address = addressSchema.safeParse({ planting, zone });
  if (!address.success) notFound();
  const { actor, data } = await readPage(org, 'replant.read', (context) =>
    readReplant(context, { planting, zone: address.data.zone ?? undefined }),
  );
  const queries = new QueryClient();
  queries.setQueryData(replantQuery(org, planting, address.data.zone).queryKey, data);
  return (
    <HydrationBoundary state={dehydrate(queries)}>
      <Decide
        org={org}
        planting={planting}
        zone={address.data.zone}
        maySign={can(actor, 'decision.sign')}
        mayWrite={can(actor, 'replant.write')}
      />
    </HydrationBoundary>
  );
}
