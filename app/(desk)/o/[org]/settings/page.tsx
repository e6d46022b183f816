import type { Metadata } from 'next';
import { SettingForm } from '@/components/setting/setting-form';
import { SettingList } from '@/components/setting/setting-list';
import { PageHead } from '@/components/shell/page-head';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/section';
import { can } from '@/lib/access/can';
import { readPage } from '@/lib/server/http/read-page';
import { readSettings } from '@/lib/server/services/settings/read-settings';
import { settingTexts } from '@/lib/texts/setting-texts';

export const metadata: Metadata = { title: settingTexts.title };

export default async function SettingsPage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  // The list of settings is the planner's; in a blind trial a scout must not read it.
  const { actor, data: settings } = await readPage(org, 'settings.write', readSettings);
  const mayWrite = can(actor, 'settings.write');
  return (
    <>
      <PageHead title={settingTexts.title} sub={settingTexts.lead} />
      {settings.length === 0 ? <EmptyState title={settingTexts.none}>{settingTexts.noneHint}</EmptyState> : null}
      <SettingList settings={settings} mayWrite={mayWrite} />
      <div className="py-6">
        <Notice>{settingTexts.caution}</Notice>
      </div>
      <Section title={settingTexts.addTitle}>
        <SettingForm />
      </Section>
    </>
  );
}
