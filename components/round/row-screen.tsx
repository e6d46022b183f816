'use client';

import { dayNumber } from '@/lib/client/round/due-row';
import type { RoundPlace } from '@/lib/client/round/round';
import { goTo, useAddress, type RoundScreen } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import { Button } from '@/components/ui/button';
import { roundCountTexts, roundTexts, todayTexts } from '@/lib/texts/round-texts';
import { RoundBar } from './round-bar';
import { RowBefore } from './row-before';
import { whereText } from './today-screen';

const screens: readonly { at: RoundScreen; label: string }[] = [
  { at: 'tape', label: roundCountTexts.tape },
  { at: 'depth', label: roundCountTexts.depth },
  { at: 'cover', label: roundCountTexts.cover },
  { at: 'dig', label: roundCountTexts.dig },
  { at: 'crust', label: roundCountTexts.crust },
  { at: 'photos', label: roundCountTexts.photo },
  { at: 'note', label: roundCountTexts.note },
  { at: 'condition', label: roundCountTexts.condition },
];

/** One row sample: what can be done at it, and what was counted there. */
export function RowScreen({ planting, field, row }: RoundPlace) {
  const round = useRound();
  const address = useAddress();
  return (
    <RoundBar back={{ label: roundTexts.today, onPress: () => goTo({ ...address, at: 'today', planting: null, row: null }) }}>
      <h1 className="px-3 pt-3 text-27 leading-none">{row.label}</h1>
      <p className="px-3 pt-1 text-15">{[field.name, whereText(row), row.length.typed].filter(Boolean).join(', ')}</p>
      <RowBefore row={row} planting={planting} today={round.now().date} />
      <div className="grid grid-cols-2 gap-2 px-3 py-4">
        <div className="col-span-2">
          <Button wide onClick={() => goTo({ ...address, at: 'count' })}>
            {roundCountTexts.count}
          </Button>
        </div>
        {screens.map(({ at, label }) => (
          <Button key={at} look="secondary" wide onClick={() => goTo({ ...address, at })}>
            {label}
          </Button>
        ))}
      </div>
      <section className="border-t-2 border-ink px-3 pt-3 pb-8">
        <h2 className="text-18">{roundCountTexts.counts}</h2>
        <ul>
          {[...row.counts].reverse().map((count) => (
            <li key={count.id} className="flex items-baseline justify-between gap-3 border-b border-rule py-2 text-15">
              <span>
                {todayTexts.day(dayNumber(planting.plantedOn, count.visitedOn))}
                {count.visitedAt ? `, ${count.visitedAt}` : ''}
                {count.marker ? `, ${count.marker}` : ''}
                <span className="block">{count.personName}{count.used ? '' : `, ${roundCountTexts.notUsed}`}</span>
              </span>
              <span className="font-mono text-18 font-bold">
                {count.plantsUp}
                {count.doubtful > 0 ? <span className="text-15 font-normal"> ({count.doubtful})</span> : null}
              </span>
            </li>
          ))}
        </ul>
      </section>
    </RoundBar>
  );
}
