import { v7 } from 'uuid';
import { layout } from '@/lib/agronomy/layout';
import { randomSeedMost } from '@/lib/schemas/trial';
import type { ComparisonRule, MainFigure } from '@/lib/schemas/vocabulary';

export type TrialDraft = {
  studyName: string;
  settingIds: string[];
  referenceSettingId: string;
  mainFigure: MainFigure;
  comparisonRule: ComparisonRule;
  blocks: number;
  randomSeed: number;
};

/** A seed nobody chose, so that nobody can say the layout was picked. */
export function freshSeed(): number {
  const words = new Uint32Array(1);
  crypto.getRandomValues(words);
  return (words[0] ?? 0) % (randomSeedMost + 1);
}

/** The layout that a draft draws; nothing while there are too few settings. */
export function drawnLayout(draft: TrialDraft) {
  if (draft.settingIds.length < 2) return undefined;
  return layout({ settings: draft.settingIds, blocks: draft.blocks, seed: draft.randomSeed });
}

/** What is sent: the layout as it stands on the screen, each block and strip under an id made here. */
export function trialBody(draft: TrialDraft, plantingId: string, studyId: string, replacesTrialId: string | null): Record<string, unknown> {
  const drawn = drawnLayout(draft);
  return {
    ...draft,
    plantingId,
    studyId,
    replacesTrialId,
    layout: draft.settingIds.length === 2 ? 'pairs' : 'complete-blocks',
    blocks: (drawn?.blocks ?? []).map((block) => ({
      id: v7(),
      strips: block.strips.map((strip) => ({ id: v7(), settingId: strip.setting })),
    })),
  };
}
