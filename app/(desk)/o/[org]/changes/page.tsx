import type { Metadata } from 'next';
import { z } from 'zod';
import { ChangeList } from '@/components/changes/change-list';
import { PageHead } from '@/components/shell/page-head';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/section';
import { paths } from '@/lib/paths/paths';
import { readPage } from '@/lib/server/http/read-page';
import { readChanges } from '@/lib/server/services/audit/read-changes';
import { changeTexts } from '@/lib/texts/change-texts';

export const metadata: Metadata = { title: changeTexts.title };

type PageProps = { params: Promise<{ org: string }>; searchParams: Promise<{ before?: string | string[] }> };

// A page's mark is the instant of its last change; anything else begins at the newest.
const markSchema = z.string().max(60).refine((text) => !Number.isNaN(Date.parse(text))).nullable().catch(null);

export default async function ChangesPage({ params, searchParams }: PageProps) {
  const { org } = await params;
  const before = markSchema.parse((await searchParams).before ?? null);
  const { organisation, data } = await readPage(org, 'changes.read', (context) => readChanges(context, { before }));
  const { changes, losingEdits, older, brokenAt } = data;
  return (
    <>
      <PageHead title={changeTexts.title} sub={changeTexts.lead} />
      {brokenAt === null ? <p className="pb-4">{changeTexts.whole}</p> : <Notice>{changeTexts.broken(brokenAt)}</Notice>}
      {losingEdits.length > 0 ? (
        <Section title={changeTexts.losingTitle} lead={changeTexts.losingLead}>
          <ChangeList changes={losingEdits.map((each) => ({ ...each, id: each.operationId, at: each.receivedAt }))} timeZone={organisation.timeZone} />
        </Section>
      ) : null}
      {changes.length === 0 ? <EmptyState title={changeTexts.none}>{changeTexts.noneHint}</EmptyState> : null}
      <ChangeList changes={changes.map((each) => ({ ...each, at: each.recordedAt }))} timeZone={organisation.timeZone} />
      {older ? (
        <div className="pt-4">
          <LinkButton href={`${paths.changes(org)}?before=${encodeURIComponent(older)}`}>{changeTexts.older}</LinkButton>
        </div>
      ) : null}
    </>
  );
}
