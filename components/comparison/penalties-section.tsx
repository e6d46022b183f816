'use client';

import { SeriesSample } from '@/components/charts/series-name';
import { FigureOpener } from '@/components/scores/figure-opener';
import type { FigureSubject } from '@/components/scores/figure-subject';
import { Section } from '@/components/ui/section';
import type { PenaltyStudy } from '@/lib/agronomy/penalty/penalty';
import type { ComparedSetting, TrialComparison } from '@/lib/schemas/comparison';
import type { PlantingFacts } from '@/lib/schemas/planting-facts';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { figureNames, lateStudies, scoreTexts, spacingStudies } from '@/lib/texts/score-texts';

const texts = comparisonTexts.penalties;

/** What each study says of each setting, one line a study; studies that can be read nowhere are named once, with why. */
export function PenaltiesSection({ comparison }: { comparison: TrialComparison }) {
  const { settings, planting } = comparison;
  const columns = { gridTemplateColumns: `repeat(${settings.length}, minmax(0, 1fr))` };
  return (
    <Section title={texts.title} lead={texts.lead}>
      <div role="table" aria-label={texts.title} className="flex flex-col">
        <div role="row" className="grid gap-x-4 border-b border-ink pb-1 md:grid-cols-[13rem_1fr]">
          <span role="columnheader" className="sr-only">
            {texts.study}
          </span>
          <span aria-hidden="true" className="hidden md:block" />
          <div className="grid gap-x-3" style={columns} role="presentation">
            {settings.map((setting) => (
              <span role="columnheader" key={setting.settingId} className="text-13 leading-tight font-bold md:text-right">
                <span className="block pb-0.5">
                  <SeriesSample index={setting.seriesIndex} />
                </span>
                {setting.name}
              </span>
            ))}
          </div>
        </div>
        <Group title={texts.late} studies={lateStudies} settings={settings} planting={planting} columns={columns} />
        <Group title={texts.spacing} studies={spacingStudies} settings={settings} planting={planting} columns={columns} />
      </div>
    </Section>
  );
}

type GroupProps = {
  title: string;
  studies: readonly PenaltyStudy[];
  settings: readonly ComparedSetting[];
  planting: PlantingFacts;
  columns: { gridTemplateColumns: string };
};

function Group({ title, studies, settings, planting, columns }: GroupProps) {
  const said = studies.filter((study) => settings.some((setting) => setting.scored.penalties[study].kind === 'value'));
  return (
    <>
      <h3 className="pt-4 pb-1 text-15">{title}</h3>
      {said.map((study) => (
        <div role="row" key={study} className="grid items-baseline gap-x-4 border-b border-rule py-1.5 md:grid-cols-[13rem_1fr]">
          <span role="rowheader" className="text-15">
            {figureNames[study]}
          </span>
          <div className="grid gap-x-3" style={columns} role="presentation">
            {settings.map((setting) => {
              return (
                <span role="cell" key={setting.settingId} className="font-mono text-13 md:text-right md:text-15">
                  <FigureOpener id={study} of={setting.name} subject={subjectOf(setting, planting)} />
                </span>
              );
            })}
          </div>
        </div>
      ))}
      {unsaid(studies, settings).map((sentence) => (
        <p key={sentence} className="pt-2 text-13 text-ink-soft">
          {sentence}
        </p>
      ))}
    </>
  );
}

function subjectOf({ scored }: ComparedSetting, planting: PlantingFacts): FigureSubject {
  return { planting, ...scored, row: null };
}

/** Studies that can be read of no setting, gathered by what they lack. */
function unsaid(studies: readonly PenaltyStudy[], settings: readonly ComparedSetting[]): string[] {
  const byReason = new Map<string, string[]>();
  for (const study of studies) {
    const answers = settings.map((setting) => setting.scored.penalties[study]);
    const first = answers[0];
    if (first?.kind !== 'insufficient' || answers.some((answer) => answer.kind === 'value')) continue;
    const why = scoreTexts.needs(first.needed, first.had);
    byReason.set(why, [...(byReason.get(why) ?? []), figureNames[study]]);
  }
  return [...byReason].map(([why, names]) => texts.cannot(names.join('; '), why));
}
