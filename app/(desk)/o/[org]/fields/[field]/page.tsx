import Link from 'next/link';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { FieldActions } from '@/components/field/field-actions';
import { RestrictionsSection } from '@/components/entry-restriction/restrictions-section';
import { AddPlanting } from '@/components/planting/add-planting';
import { plantingLine } from '@/components/planting/planting-line';
import { PageHead } from '@/components/shell/page-head';
import { EmptyState } from '@/components/ui/empty-state';
import { Section } from '@/components/ui/section';
import { can } from '@/lib/access/can';
import { readingText } from '@/lib/format/reading-text';
import { paths } from '@/lib/paths/paths';
import { readPage } from '@/lib/server/http/read-page';
import { readFieldRestrictions } from '@/lib/server/services/entry-restrictions/read-field-restrictions';
import { readField } from '@/lib/server/services/fields/read-field';
import { fieldTexts } from '@/lib/texts/field-texts';

export default async function FieldPage({ params }: { params: Promise<{ org: string; field: string }> }) {
  const { org, field: fieldId } = await params;
  if (!z.uuid().safeParse(fieldId).success) notFound();
  const { actor, data } = await readPage(org, 'farms.read', async (context) => ({
    ...(await readField(context, fieldId)),
    entry: await readFieldRestrictions(context, fieldId),
  }));
  const { farm, field, plantings, entry } = data;
  return (
    <>
      <PageHead
        kicker={<Link href={paths.farm(org, farm.id)}>{farm.name}</Link>}
        title={field.name}
        sub={field.area ? readingText(field.area) : fieldTexts.areaMissing}
        actions={can(actor, 'farms.write') ? <FieldActions farmId={farm.id} field={field} /> : null}
      />
      <Section title={fieldTexts.plantingsTitle}>
        {plantings.length === 0 ? <EmptyState title={fieldTexts.noPlanting}>{fieldTexts.noPlantingHint}</EmptyState> : null}
        <ul>
          {plantings.map((planting) => (
            <li key={planting.plantingId} className="border-b border-rule first:border-t">
              <Link className="flex min-h-press items-center py-2" href={paths.plan(org, planting.plantingId)}>
                {plantingLine(planting)}
              </Link>
            </li>
          ))}
        </ul>
      </Section>
      <RestrictionsSection fieldId={field.id} {...entry} />
      {can(actor, 'plantings.write') ? (
        <Section title={fieldTexts.addPlanting}>
          <AddPlanting fieldId={field.id} />
        </Section>
      ) : null}
    </>
  );
}
