import { notFound } from 'next/navigation';
import type { ReactNode } from 'react';
import { z } from 'zod';
import { PlantingSeason } from '@/components/planting/planting-season';
import { readPage } from '@/lib/server/http/read-page';
import { readSeason } from '@/lib/server/services/plantings/read-season';

type LayoutProps = { params: Promise<{ org: string; planting: string }>; children: ReactNode };

/** Every page of a planting stands below its season. */
export default async function PlantingLayout({ params, children }: LayoutProps) {
  const { org, planting } = await params;
  if (!z.uuid().safeParse(planting).success) notFound();
  const { data: season } = await readPage(org, 'plantings.read', (context) => readSeason(context, planting));
  return (
    <>
      <PlantingSeason org={org} season={season} />
      {children}
    </>
  );
}
