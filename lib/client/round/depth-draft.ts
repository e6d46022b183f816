import { depthsMost } from '@/lib/schemas/field-limits';
import { parseSeedingDepth } from '@/lib/schemas/seeding-depth';
import type { DepthUnit } from '@/lib/schemas/vocabulary';

/** Depths as they are typed, plant by plant. */
export type DepthDraft = { unit: DepthUnit; depths: string[]; current: string };
export type DepthPress = { press: 'key'; text: string } | { press: 'back' } | { press: 'next' } | { press: 'unit'; unit: DepthUnit };

export const emptyDepths: DepthDraft = { unit: 'in', depths: [], current: '' };
export const plantsWanted = 10;
const lettersMost = 10;

/** The draft after one press. A quarter goes behind the whole inches: 1 and ¾ is "1 3/4". */
export function afterDepthPress(draft: DepthDraft, pressed: DepthPress): DepthDraft {
  const { depths, current } = draft;
  switch (pressed.press) {
    case 'key': {
      const joined = pressed.text.includes('/') ? `${current.replace(/\s*\d+\/\d+$/, '')} ${pressed.text}`.trim() : `${current}${pressed.text}`;
      return joined.length > lettersMost || (/\//.test(current) && !pressed.text.includes('/')) ? draft : { ...draft, current: joined };
    }
    case 'back':
      if (current !== '') return { ...draft, current: current.includes(' ') ? current.slice(0, current.lastIndexOf(' ')) : /\//.test(current) ? '' : current.slice(0, -1) };
      return { ...draft, depths: depths.slice(0, -1), current: depths.at(-1) ?? '' };
    case 'next':
      return depths.length < depthsMost && parseSeedingDepth(current, draft.unit).ok ? { ...draft, depths: [...depths, current], current: '' } : draft;
    case 'unit':
      // Depths typed so far keep the unit they were typed in; another unit begins anew.
      return depths.length === 0 ? { ...draft, unit: pressed.unit, current: '' } : draft;
  }
}

/** Mean and range of what was typed, in its own unit; undefined before there is a depth. */
export function depthFigures(depths: readonly string[], unit: DepthUnit): { mean: number; least: number; most: number } | undefined {
  const read = depths.flatMap((typed) => {
    const parsed = parseSeedingDepth(typed, unit);
    return parsed.ok ? [parsed.reading.thousandths / 1_000] : [];
  });
  if (read.length === 0) return undefined;
  return { mean: read.reduce((sum, each) => sum + each, 0) / read.length, least: Math.min(...read), most: Math.max(...read) };
}
