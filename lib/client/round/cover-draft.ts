import { marksMost } from '@/lib/schemas/field-limits';

/** Marks read one by one: h over residue, b bare. A text, so that each press adds one letter and undo takes one away. */
export type CoverDraft = { marks: string; stripId: string | null };
export const emptyCover: CoverDraft = { marks: '', stripId: null };
export const marksUsual = 100;
/** Fewer marks than this tell too little; the answer is asked about before it is kept. */
export const marksFew = 50;

export type CoverPress = 'residue' | 'bare' | 'undo';

export function afterCoverPress(draft: CoverDraft, pressed: CoverPress): CoverDraft {
  if (pressed === 'undo') return { ...draft, marks: draft.marks.slice(0, -1) };
  return draft.marks.length >= marksMost ? draft : { ...draft, marks: draft.marks + (pressed === 'residue' ? 'h' : 'b') };
}

export function coverFigures(draft: CoverDraft): { marksRead: number; marksCovered: number; percent: number | null } {
  const marksRead = draft.marks.length;
  const marksCovered = [...draft.marks].filter((mark) => mark === 'h').length;
  return { marksRead, marksCovered, percent: marksRead === 0 ? null : (100 * marksCovered) / marksRead };
}
