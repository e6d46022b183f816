import { notFound } from 'next/navigation';
import { z } from 'zod';
import { FarmActions } from '@/components/farm/farm-actions';
import { FieldForm } from '@/components/field/field-form';
import { FieldList } from '@/components/field/field-list';
import { PageHead } from '@/components/shell/page-head';
import { EmptyState } from '@/components/ui/empty-state';
import { Section } from '@/components/ui/section';
import { can } from '@/lib/access/can';
import { readPage } from '@/lib/server/http/read-page';
import { readFarm } from '@/lib/server/services/farms/read-farm';
import { fieldTexts } from '@/lib/texts/field-texts';

export default async function FarmPage({ params }: { params: Promise<{ org: string; farm: string }> }) {
  const { org, farm: farmId } = await params;
  if (!z.uuid().safeParse(farmId).success) notFound();
  const { actor, data } = await readPage(org, 'farms.read', (context) => readFarm(context, farmId));
  const { farm, fields } = data;
  const mayWrite = can(actor, 'farms.write');
  return (
    <>
      <PageHead title={farm.name} sub={farm.timeZone} actions={mayWrite ? <FarmActions farm={farm} /> : null} />
      <Section title={fieldTexts.fieldsTitle}>
        {fields.length === 0 ? <EmptyState title={fieldTexts.none}>{fieldTexts.noneHint}</EmptyState> : null}
        <FieldList org={org} fields={fields} />
      </Section>
      {mayWrite ? (
        <Section title={fieldTexts.addTitle}>
          <FieldForm farmId={farm.id} />
        </Section>
      ) : null}
    </>
  );
}
