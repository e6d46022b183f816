import type { Metadata } from 'next';
import { PlantingFacts } from '@/components/plan/planting-facts';
import { RowSampleSection } from '@/components/row-sample/row-sample-section';
import { PageHead } from '@/components/shell/page-head';
import { TrialSection } from '@/components/trial/trial-section';
import { countText } from '@/lib/format/count-text';
import { readPage } from '@/lib/server/http/read-page';
import { readPlan, type Plan } from '@/lib/server/services/plantings/read-plan';
import { planTexts } from '@/lib/texts/plan-texts';

export const metadata: Metadata = { title: planTexts.pageTitle };

export default async function PlanPage({ params }: { params: Promise<{ org: string; planting: string }> }) {
  const { org, planting: plantingId } = await params;
  const { data: plan } = await readPage(org, 'plantings.read', (context) => readPlan(context, plantingId));
  const settings = plan.settings.map(({ id, name }) => ({ id, name }));
  return (
    <>
      <PageHead title={titleOf(plan)} />
      <PlantingFacts fieldId={plan.field.id} planting={plan.planting} mayWrite={plan.may.write} />
      {plan.may.showTrial ? <TrialSection plantingId={plantingId} settings={settings} trial={plan.trial} mayLayOut={plan.may.layOut} /> : null}
      <RowSampleSection
        plantingId={plantingId}
        rowSpacing={plan.planting.rowSpacing}
        samples={plan.rowSamples}
        strips={plan.strips}
        zones={plan.planting.zones}
        mayWrite={plan.may.write}
      />
    </>
  );
}

function titleOf({ trial, rowSamples }: Plan): string {
  if (trial) {
    const settings = new Set(trial.strips.map((strip) => strip.plannedSettingId)).size;
    const blocks = new Set(trial.strips.map((strip) => strip.blockNumber)).size;
    return planTexts.titleTrial(countText(settings, 'setting'), countText(blocks, 'block'));
  }
  return rowSamples.length > 0 ? planTexts.titleSamples(countText(rowSamples.length, 'row sample')) : planTexts.titleNothing;
}
