'use client';

import { SeriesName } from '@/components/charts/series-name';
import { DataTable } from '@/components/ui/data-table';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import type { ComparedFigure, ComparedSetting, TrialComparison } from '@/lib/schemas/comparison';
import { comparedFigureNames, comparisonTexts } from '@/lib/texts/comparison-texts';
import { figureWords } from './figure-words';
import { comparedBy } from './main-figure';
import { MeanOpener, meanBound, meanText } from './mean-opener';

const texts = comparisonTexts.table;

const columns: readonly ComparedFigure[] = [
  'plants-per-acre',
  'share-of-seed',
  'half-up-days',
  'spread-days',
  'late-share',
  'spacing-sd',
  'spacing-cv',
  'in-row-cover',
  'score',
];

/** The settings side by side: a table at a desk, one setting under the other on a phone. */
export function SettingsSection({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const { trial, settings, finding } = comparison;
  const spokenOf = trial.isLocked && finding.kind === 'difference' ? finding.setting : null;
  const lettersOf = (setting: ComparedSetting) =>
    trial.isLocked ? (comparedBy(comparison, trial.mainFigure).means.find((mean) => mean.settingId === setting.settingId)?.letters ?? null) : null;
  const hasLetters = settings.some((setting) => lettersOf(setting) !== null);
  const head = (figure: ComparedFigure) => {
    const words = figureWords(figure, units);
    return [words.head, words.columnUnit].filter(Boolean).join(', ');
  };
  const value = (figure: ComparedFigure, setting: ComparedSetting) => (
    <>
      <MeanOpener comparison={comparison} figure={figure} setting={setting} />
      {figure === trial.mainFigure ? <Letters letters={lettersOf(setting)} hasLetters={hasLetters} /> : null}
    </>
  );
  const about = (setting: ComparedSetting) =>
    [setting.isReference ? texts.reference : '', texts.strips(setting.strips, setting.rowSamples)].filter(Boolean).join('; ');
  return (
    <Section title={texts.title} lead={texts.lead}>
      <div className="hidden lg:block">
        <DataTable
          caption={texts.title}
          fileName="settings"
          emptyText=""
          columns={[
            { key: 'name', head: texts.setting },
            ...columns.map((figure) => ({ key: figure, head: head(figure), align: 'number' as const })),
          ]}
          rows={settings.map((setting) => ({
            id: setting.settingId,
            highlighted: setting.settingId === spokenOf,
            cells: {
              name: {
                text: setting.name,
                node: <SeriesName index={setting.seriesIndex} name={setting.name} />,
                detail: about(setting),
              },
              ...Object.fromEntries(
                columns.map((figure) => {
                  const shown = meanText({ comparison, figure, setting }, figureWords(figure, units));
                  const letters = figure === trial.mainFigure ? lettersOf(setting) : null;
                  return [figure, {
                    ...shown,
                    text: letters ? `${shown.text} ${letters}` : shown.text,
                    node: value(figure, setting),
                    detail: meanBound({ comparison, figure, setting }) ?? '',
                  }];
                }),
              ),
            },
          }))}
        />
      </div>
      <ul className="border-t border-rule lg:hidden">
        {settings.map((setting) => (
          <li key={setting.settingId} className={`border-b border-rule py-3 ${setting.settingId === spokenOf ? '-mx-4 bg-bone px-4' : ''}`}>
            <h3 className="text-18">
              <SeriesName index={setting.seriesIndex} name={setting.name} />
            </h3>
            <p className={`text-13 ${setting.settingId === spokenOf ? 'text-ink' : 'text-ink-soft'}`}>{about(setting)}</p>
            <dl className="grid grid-cols-3 gap-x-4 gap-y-2 pt-2 sm:grid-cols-5">
              {columns.map((figure) => (
                <div key={figure}>
                  <dt className={`text-13 ${figure === trial.mainFigure ? 'font-bold' : ''}`}>{head(figure)}</dt>
                  <dd className="font-mono text-15">
                    {value(figure, setting)}
                    <span className="block font-sans text-13">{meanBound({ comparison, figure, setting })}</span>
                  </dd>
                </div>
              ))}
            </dl>
          </li>
        ))}
      </ul>
      {hasLetters ? (
        <p className="max-w-reading text-13 text-ink-soft">{texts.letters(comparedFigureNames[trial.mainFigure].name)}</p>
      ) : trial.isLocked && trial.rule === 'holm' ? (
        <p className="max-w-reading text-13 text-ink-soft">{texts.noLetters}</p>
      ) : null}
    </Section>
  );
}

/** Right of the number, in as much room as the longest letters need, so that the numbers stay in line. */
function Letters({ letters, hasLetters }: { letters: string | null; hasLetters: boolean }) {
  if (!hasLetters) return null;
  return <span className="inline-block w-8 pl-1.5 text-left text-13 font-bold">{letters}</span>;
}
