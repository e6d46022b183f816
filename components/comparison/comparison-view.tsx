'use client';

import { useQuery } from '@tanstack/react-query';
import { PageHead } from '@/components/shell/page-head';
import { LinkButton } from '@/components/ui/link-button';
import { Notice } from '@/components/ui/notice';
import { Skeleton } from '@/components/ui/skeleton';
import { comparisonQuery } from '@/lib/client/queries/comparison-query';
import { useWho } from '@/lib/client/who';
import { paths } from '@/lib/paths/paths';
import type { TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts as texts } from '@/lib/texts/comparison-texts';
import { scoreTexts } from '@/lib/texts/score-texts';
import { AlsoSeenSection } from './also-seen-section';
import { BlocksSection } from './blocks-section';
import { comparisonWords } from './comparison-words';
import { CurvesSection } from './curves-section';
import { DifferencesSection } from './differences-section';
import { noteSentences } from './note-sentences';
import { PenaltiesSection } from './penalties-section';
import { SettingsSection } from './settings-section';
import { TypicalRowsSection } from './typical-rows-section';
import { WorkingSection } from './working-section';

/** How the settings of a trial compare: the finding, then the evidence, all from one answer that renews itself. */
export function ComparisonView({ plantingId }: { plantingId: string }) {
  const { organisationId } = useWho();
  const { data: comparison, error } = useQuery(comparisonQuery(organisationId, plantingId));
  if (!comparison) return error ? <Notice title={error.message}>{scoreTexts.tryAgain}</Notice> : <Skeleton label={texts.reading} lines={6} />;
  if (comparison.kind === 'no-trial') {
    return (
      <PageHead
        title={texts.noTrial}
        sub={texts.noTrialHint}
        actions={<LinkButton href={paths.plan(organisationId, plantingId)}>{texts.toPlan}</LinkButton>}
      />
    );
  }
  return (
    <>
      {error ? <Notice>{scoreTexts.notRenewed(error.message)}</Notice> : null}
      <TrialFinding comparison={comparison} />
      {comparison.settings.some((setting) => setting.rowSamples > 0) ? (
        <TrialEvidence comparison={comparison} />
      ) : (
        <LinkButton href={paths.count(organisationId, plantingId)}>{texts.toCount}</LinkButton>
      )}
    </>
  );
}

function TrialFinding({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const { headline, sub, more } = comparisonWords(comparison, units);
  const notes = [...more, ...noteSentences(comparison, units)];
  if (notes.length === 0) return <PageHead title={headline} sub={<p>{sub.join(' ')}</p>} />;
  return (
    <div className="grid gap-x-10 lg:grid-cols-[minmax(0,1.55fr)_minmax(0,1fr)]">
      <PageHead title={headline} sub={<p>{sub.join(' ')}</p>} />
      <aside aria-labelledby="beside" className="-mt-2 pb-8 lg:mt-1 lg:border-l-2 lg:border-rule lg:pl-6">
        <h2 id="beside" className="text-15">
          {texts.notes.title}
        </h2>
        <ul className="flex max-w-reading flex-col gap-1.5 pt-1 text-15">
          {notes.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </ul>
      </aside>
    </div>
  );
}

function TrialEvidence({ comparison }: { comparison: TrialComparison }) {
  return (
    <>
      <div className="grid gap-x-10 lg:grid-cols-[minmax(0,1.55fr)_minmax(0,1fr)]">
        <CurvesSection comparison={comparison} />
        <DifferencesSection comparison={comparison} />
      </div>
      <SettingsSection comparison={comparison} />
      <TypicalRowsSection comparison={comparison} />
      <div className="grid gap-x-10 lg:grid-cols-[minmax(0,1.55fr)_minmax(0,1fr)]">
        <PenaltiesSection comparison={comparison} />
        <BlocksSection comparison={comparison} />
      </div>
      <AlsoSeenSection comparison={comparison} />
      <WorkingSection comparison={comparison} />
    </>
  );
}
