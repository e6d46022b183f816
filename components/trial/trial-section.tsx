'use client';

import Link from 'next/link';
import { OpeningForm } from '@/components/form/opening-form';
import { EmptyState } from '@/components/ui/empty-state';
import { Section } from '@/components/ui/section';
import { smallestAttainableP } from '@/lib/agronomy/layout';
import { useWho } from '@/lib/client/who';
import { instantText } from '@/lib/format/instant-text';
import { paths } from '@/lib/paths/paths';
import type { ComparisonRule, MainFigure } from '@/lib/schemas/vocabulary';
import { trialTexts } from '@/lib/texts/trial-texts';
import { AsPlanted, type PlantedStrip } from './as-planted';
import { LockTrial } from './lock-trial';
import { StripMap } from './strip-map';
import { Reach, TrialForm } from './trial-form';

export type PlannedTrial = {
  id: string;
  version: number;
  studyId: string;
  studyName: string;
  mainFigure: MainFigure;
  comparisonRule: ComparisonRule;
  referenceSettingId: string;
  randomSeed: number;
  lockedAt: string | null;
  strips: readonly (PlantedStrip & { blockNumber: number })[];
};

type TrialSectionProps = {
  plantingId: string;
  settings: readonly { id: string; name: string }[];
  trial: PlannedTrial | null;
  mayLayOut: boolean;
};

/** The trial of a planting, from drawing it over locking it to what was really planted. */
export function TrialSection({ plantingId, settings, trial, mayLayOut }: TrialSectionProps) {
  return (
    <Section title={trialTexts.title} lead={trialTexts.lead}>
      {trial ? (
        <LaidOut plantingId={plantingId} settings={settings} trial={trial} mayLayOut={mayLayOut} />
      ) : (
        <NotLaidOut plantingId={plantingId} settings={settings} mayLayOut={mayLayOut} />
      )}
    </Section>
  );
}

function NotLaidOut({ plantingId, settings, mayLayOut }: Omit<TrialSectionProps, 'trial'>) {
  const { organisationId } = useWho();
  return (
    <>
      <EmptyState title={trialTexts.none}>{trialTexts.noneHint}</EmptyState>
      {!mayLayOut ? null : settings.length < 2 ? (
        <p>
          {trialTexts.needSettings} <Link href={paths.settings(organisationId)}>{trialTexts.toSettings}</Link>
        </p>
      ) : (
        <TrialForm plantingId={plantingId} settings={settings} standing={null} />
      )}
    </>
  );
}

function LaidOut({ plantingId, settings, trial, mayLayOut }: Omit<TrialSectionProps, 'trial'> & { trial: PlannedTrial }) {
  const { timeZone } = useWho();
  const nameOf = (id: string) => settings.find((setting) => setting.id === id)?.name ?? '';
  const settingIds = settings.map(({ id }) => id).filter((id) => trial.strips.some((strip) => strip.plannedSettingId === id));
  const blocks = new Set(trial.strips.map((strip) => strip.blockNumber)).size;
  const instead = ({ plannedSettingId, asPlanted }: PlantedStrip) =>
    asPlanted === null || asPlanted.settingId === plannedSettingId ? null : asPlanted.settingId ? nameOf(asPlanted.settingId) : trialTexts.lostShort;
  return (
    <>
      <p className="max-w-reading">
        {trialTexts.facts(trial.studyName, trialTexts.mainFigures[trial.mainFigure], nameOf(trial.referenceSettingId), trialTexts.rules[trial.comparisonRule])}
      </p>
      <p>
        <span className="font-bold">
          {trial.lockedAt ? trialTexts.lockedOn(instantText(trial.lockedAt, timeZone)) : trialTexts.notLocked}
        </span>{' '}
        <span className="font-mono text-13">{trialTexts.seed(String(trial.randomSeed))}</span>
      </p>
      <StripMap
        strips={trial.strips.map((strip) => ({
          id: strip.id,
          blockNumber: strip.blockNumber,
          number: strip.number,
          setting: nameOf(strip.plannedSettingId),
          instead: instead(strip),
          isReference: strip.plannedSettingId === trial.referenceSettingId,
        }))}
      />
      <Reach p={smallestAttainableP(settingIds.length, blocks)} />
      {!mayLayOut ? null : trial.lockedAt ? (
        <div className="flex flex-col gap-2 border-t border-rule pt-3">
          <h3 className="text-15 font-bold">{trialTexts.plantedTitle}</h3>
          <AsPlanted trialId={trial.id} strips={trial.strips} settings={settings} />
        </div>
      ) : (
        <div className="flex flex-wrap items-start gap-2">
          <LockTrial trial={trial} />
          <OpeningForm
            label={trialTexts.change}
            form={(close) => (
              <TrialForm
                plantingId={plantingId}
                settings={settings}
                standing={{
                  id: trial.id,
                  studyId: trial.studyId,
                  draft: {
                    studyName: trial.studyName,
                    settingIds,
                    referenceSettingId: trial.referenceSettingId,
                    mainFigure: trial.mainFigure,
                    comparisonRule: trial.comparisonRule,
                    blocks,
                  },
                }}
                onDone={close}
              />
            )}
          />
        </div>
      )}
    </>
  );
}
