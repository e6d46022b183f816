'use client';

import { SeriesName } from '@/components/charts/series-name';
import { DataTable } from '@/components/ui/data-table';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { comparedFigures, type ComparedFigure, type TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { figureWords } from './figure-words';
import { comparedBy, differencesFromReference, referenceOf } from './main-figure';

const texts = comparisonTexts.alsoSeen;

/** The stand says the same of seeds; a second line for it would look like a second finding. */
const saidTwice: readonly ComparedFigure[] = ['share-of-seed'];

/** The other figures against the reference, with intervals and without claims. */
export function AlsoSeenSection({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const { trial, settings } = comparison;
  const others = settings.filter((setting) => !setting.isReference);
  const shown = comparedFigures
    .filter((figure) => (figure !== trial.mainFigure || !trial.isLocked) && !saidTwice.includes(figure))
    .map((figure) => {
      const words = figureWords(figure, units);
      const differences = differencesFromReference(comparedBy(comparison, figure), trial.referenceSettingId);
      return {
        figure,
        head: `${words.head}, ${words.unit}`,
        cells: others.map((setting) => {
          const found = differences.find((each) => each.settingId === setting.settingId);
          return {
            setting,
            sort: found?.difference ?? null,
            text: found ? words.signedAlone(found.difference) : comparisonTexts.table.missing,
            interval: found ? words.signedRange(found.lower, found.upper) : '',
          };
        }),
      };
    });
  return (
    <Section title={texts.title} lead={texts.lead(referenceOf(comparison)?.name ?? '')}>
      <div className="hidden md:block">
        <DataTable
          caption={texts.title}
          fileName="also-seen"
          emptyText=""
          columns={[
            { key: 'figure', head: texts.figure, sortable: false },
            ...others.map((setting) => ({ key: setting.settingId, head: setting.name, align: 'number' as const, sortable: false })),
          ]}
          rows={shown.map(({ figure, head, cells }) => ({
            id: figure,
            cells: {
              figure: { text: head },
              ...Object.fromEntries(
                cells.map((cell) => [
                  cell.setting.settingId,
                  { text: [cell.text, cell.interval].filter(Boolean).join(', '), sort: cell.sort, node: cell.text, detail: cell.interval },
                ]),
              ),
            },
          }))}
        />
      </div>
      <ul className="border-t border-rule md:hidden">
        {shown.map(({ figure, head, cells }) => (
          <li key={figure} className="border-b border-rule py-2">
            <h3 className="text-15">{head}</h3>
            <dl>
              {cells.map((cell) => (
                <div key={cell.setting.settingId} className="flex flex-wrap items-baseline justify-between gap-x-3 py-0.5">
                  <dt className="text-13">
                    <SeriesName index={cell.setting.seriesIndex} name={cell.setting.name} />
                  </dt>
                  <dd className="text-right font-mono text-13">
                    {cell.text} <span className="text-ink-soft">{cell.interval}</span>
                  </dd>
                </div>
              ))}
            </dl>
          </li>
        ))}
      </ul>
    </Section>
  );
}
