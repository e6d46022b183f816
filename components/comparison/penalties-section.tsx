'use client';

import { SeriesSample } from '@/components/charts/series-name';
import { FigureOpener } from '@/components/scores/figure-opener';
import type { FigureSubject } from '@/components/scores/figure-subject';
import { penaltyText } from '@/components/scores/penalty-text';
import { Section } from '@/components/ui/section';
import type { PenaltyStudy } from '@/lib/agronomy/penalty/penalty';
import { useWho } from '@/lib/client/who';
import { unitName } from '@/lib/format/unit-name';
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
  const { units } = useWho();
  const said = studies.filter((study) => settings.some((setting) => setting.scored.penalties[study].kind === 'value'));
  return (
    <>
      <div role="row" className="pt-4 pb-1">
        <span role="rowheader" className="text-15 font-bold">
          {title}
        </span>
      </div>
      {said.map((study) => (
        <div role="row" key={study} className="grid items-baseline gap-x-4 border-b border-rule py-1.5 md:grid-cols-[13rem_1fr]">
          <span role="rowheader" className="text-15">
            {isInYield(study, settings) ? texts.perArea(figureNames[study], unitName('yield', units)) : figureNames[study]}
          </span>
          <div className="grid gap-x-3" style={columns} role="presentation">
            {settings.map((setting) => {
              const penalty = setting.scored.penalties[study];
              return (
                <span role="cell" key={setting.settingId} className="font-mono text-13 md:text-right xl:text-15">
                  <FigureOpener
                    id={study}
                    of={setting.name}
                    subject={subjectOf(setting, planting)}
                    text={penalty.kind === 'value' ? penaltyText(penalty.value, units, false) : undefined}
                  />
                </span>
              );
            })}
          </div>
        </div>
      ))}
      {unsaid(studies, settings).map((sentence) => (
        <div role="row" key={sentence} className="pt-2">
          <span role="cell" className="text-13 text-ink-soft">
            {sentence}
          </span>
        </div>
      ))}
    </>
  );
}

function subjectOf({ scored }: ComparedSetting, planting: PlantingFacts): FigureSubject {
  return { planting, ...scored, row: null };
}

/** Whether a study counts bushels; its unit then stands once, at its name. */
function isInYield(study: PenaltyStudy, settings: readonly ComparedSetting[]): boolean {
  return settings.some(({ scored }) => {
    const penalty = scored.penalties[study];
    return penalty.kind === 'value' && penalty.value.unit === 'bushels-per-acre';
  });
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
