'use client';

import { ShallowLink } from '@/components/ui/shallow-link';
import { decimalText } from '@/lib/format/decimal-text';
import { scoreLevels, type ScoreLevel, type Scores } from '@/lib/schemas/scores';
import { scoreTexts } from '@/lib/texts/score-texts';

type LevelTabsProps = { here: string; level: ScoreLevel; things: Scores['things'] };

/** The levels one may look at, with how many things each holds; the one looked at stands in the address. */
export function LevelTabs({ here, level, things }: LevelTabsProps) {
  return (
    <nav aria-label={scoreTexts.levels.label} className="border-b border-rule" data-print="leave-out">
      <ul className="flex flex-wrap gap-x-5">
        {scoreLevels
          .filter((each) => things[each] > 0)
          .map((each) => (
            <li key={each}>
              <ShallowLink
                href={each === 'planting' ? here : `${here}?level=${each}`}
                current={each === level}
                className="flex min-h-press items-center gap-2 border-b-4 border-transparent text-15 text-ink hover:border-rule aria-[current=page]:border-ink aria-[current=page]:font-bold"
              >
                {scoreTexts.levels[each]}
                {each === 'planting' ? null : <span className="font-mono text-13 font-normal text-ink-soft">{decimalText(things[each], 0)}</span>}
              </ShallowLink>
            </li>
          ))}
      </ul>
    </nav>
  );
}
