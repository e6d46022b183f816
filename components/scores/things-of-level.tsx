'use client';

import { ShallowLink } from '@/components/ui/shallow-link';
import type { PlantingFacts } from '@/lib/schemas/planting-facts';
import type { ScoreLevel } from '@/lib/schemas/scores';
import { scoreTexts } from '@/lib/texts/score-texts';
import { LevelList } from './level-list';
import { LevelTable } from './level-table';
import { RowEvidence } from './row-evidence';
import type { ScoredThing } from './scored-things';
import { ThingDetail } from './thing-detail';

type ThingsOfLevelProps = {
  here: string;
  level: Exclude<ScoreLevel, 'planting'>;
  things: readonly ScoredThing[];
  planting: PlantingFacts;
  /** The id in the address of the one thing to show in full. */
  opened: string | null;
};

const heads = { setting: scoreTexts.setting, strip: scoreTexts.stripHead, 'row-sample': scoreTexts.rowSample } as const;

/** All things of a level side by side, or one of them with everything there is. */
export function ThingsOfLevel({ here, level, things, planting, opened }: ThingsOfLevelProps) {
  const thing = things.find((each) => each.id === opened);
  const listHref = `${here}?level=${level}`;
  const hrefOf = (id: string) => `${listHref}&open=${id}`;
  if (thing) {
    return (
      <div className="flex flex-col gap-4">
        <ShallowLink href={listHref} className="flex min-h-press w-fit items-center text-15 underline underline-offset-4">
          {scoreTexts.back[level]}
        </ShallowLink>
        <h2 className="text-27">
          {thing.name}
          {thing.detail ? <span className="block text-15 font-normal text-ink-soft">{thing.detail}</span> : null}
        </h2>
        {thing.subject ? <ThingDetail subject={thing.subject} name={thing.name} /> : <p>{thing.without}</p>}
        {thing.subject?.row ? <RowEvidence row={thing.subject.row} planting={planting} /> : null}
      </div>
    );
  }
  const caption = scoreTexts.levels[level];
  return (
    <div className="flex flex-col gap-3">
      <p className="max-w-reading text-13 text-ink-soft">{scoreTexts.tableNote}</p>
      <div className="hidden md:block">
        <LevelTable things={things} caption={caption} head={heads[level]} fileName={`scores-${level}`} hrefOf={hrefOf} />
      </div>
      <div className="md:hidden">
        <LevelList things={things} hrefOf={hrefOf} />
      </div>
    </div>
  );
}
