'use client';

import { useRouter } from 'next/navigation';
import { useWho } from '@/lib/client/who';
import { paths } from '@/lib/paths/paths';
import { PlantingForm } from './planting-form';

/** Adds a planting to a field and goes on to its plan, where trial and row samples are laid out. */
export function AddPlanting({ fieldId }: { fieldId: string }) {
  const router = useRouter();
  const { organisationId } = useWho();
  return <PlantingForm fieldId={fieldId} onAdded={(plantingId) => router.push(paths.plan(organisationId, plantingId))} />;
}
