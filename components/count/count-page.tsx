import { PageHead } from '@/components/shell/page-head';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import { paths } from '@/lib/paths/paths';
import { countTexts } from '@/lib/texts/count-texts';
import { CountList } from './count-list';
import { CountTable } from './count-table';
import type { CountRow } from './count-table-types';
import { countingHeadline } from './counting-headline';

type CountPageProps = {
  org: string;
  plantingId: string;
  table: { plantedOn: string; visitDays: readonly string[]; rows: readonly CountRow[]; mayImport: boolean; mayPlan: boolean };
};

/** Where counting stands in a planting: a table at a desk, a list on a phone. */
export function CountPage({ org, plantingId, table }: CountPageProps) {
  const { plantedOn, visitDays, rows, mayImport, mayPlan } = table;
  if (rows.length === 0) {
    return (
      <>
        <PageHead title={countTexts.title} />
        <EmptyState title={countTexts.none} action={mayPlan ? <LinkButton href={paths.plan(org, plantingId)}>{countTexts.toPlan}</LinkButton> : undefined}>
          {countTexts.noneHint}
        </EmptyState>
      </>
    );
  }
  const lastDay = visitDays.at(-1);
  return (
    <>
      <PageHead
        title={countingHeadline(rows)}
        sub={lastDay ? countTexts.lastVisit(dateText(lastDay), String(daysAfter(plantedOn, lastDay))) : undefined}
        actions={mayImport ? <LinkButton href={paths.importFile(org, plantingId)} look="secondary">{countTexts.importFile}</LinkButton> : undefined}
      />
      <div className="md:hidden">
        <CountList org={org} plantingId={plantingId} plantedOn={plantedOn} rows={rows} />
      </div>
      <div className="hidden md:block">
        <CountTable org={org} plantingId={plantingId} plantedOn={plantedOn} visitDays={visitDays} rows={rows} />
      </div>
    </>
  );
}
