'use client';

import { SeriesName } from '@/components/charts/series-name';
import { EarlinessTape } from '@/components/scores/earliness-tape';
import { standText } from '@/components/scores/shown-figure';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { daysText } from '@/lib/format/days-text';
import { rowLengthText } from '@/lib/format/row-length-text';
import type { TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';

const texts = comparisonTexts.typical;

/** One row of each setting on the tape, chosen by a rule that is said beside it. */
export function TypicalRowsSection({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const drawn = comparison.settings.flatMap((setting) => (setting.typicalRow ? [{ setting, row: setting.typicalRow }] : []));
  const without = comparison.settings.filter((setting) => !setting.typicalRow);
  const chosenBy = drawn.some(({ row }) => row.chosenBy === 'stand-and-spread') ? 'stand-and-spread' : 'stand';
  if (drawn.length === 0) {
    return (
      <Section title={texts.title}>
        <p>{texts.noneAtAll}</p>
      </Section>
    );
  }
  return (
    <Section title={texts.title} lead={texts.lead[chosenBy]}>
      <EarlinessTape
        rows={drawn.map(({ setting, row }) => ({ ...row, id: setting.settingId, label: `${setting.name}, ${row.label}` }))}
        head={(id) => {
          const found = drawn.find(({ setting }) => setting.settingId === id);
          if (!found) return null;
          const { setting, row } = found;
          const stand = standText(row.plantsPerAcre, true, units, true);
          return (
            <div>
              <h3 className="text-15">
                <SeriesName index={setting.seriesIndex} name={setting.name} />
              </h3>
              <p className="text-13 text-ink-soft">{texts.row(row.label, row.stripNumber, rowLengthText(row.lengthInches, units))}</p>
              <p className="text-13 text-ink-soft">{texts.figures(stand, row.spreadDays === null ? '' : daysText(row.spreadDays))}</p>
            </div>
          );
        }}
      />
      {without.map((setting) => (
        <p key={setting.settingId} className="text-13 text-ink-soft">
          {`${setting.name}: ${texts.none}.`}
        </p>
      ))}
    </Section>
  );
}
