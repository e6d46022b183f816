import 'server-only';
import type { Question } from '@/lib/errors/app-error';
import { countText } from '@/lib/format/count-text';
import { contentHash } from '../../operations/content-hash';

export type LineQuestion = Question & { line: number };

const linesNamed = 30;

/** What is asked of each rule over a whole file, so that a season's file is confirmed with a few answers. */
const askedTogether: Record<string, string> = {
  'more-plants-than-seeds': 'more plants than seeds were planted. Were there that many?',
  'falling-count': 'a count is lower than one before it. Have plants gone?',
  'counted-twice': 'the row was counted by the same person at the same visit already. Keep both? The first is used.',
  'place-outside-length': 'a place lies beyond the end of the row sample. Are the places right?',
  'two-at-one-mark': 'two places lie at one mark. Is that so?',
  'more-places-than-seeds': 'there are more places than seeds were planted. Were there that many?',
  'unknown-marker': 'the marker belongs to no visit of the row, so it tells no day. Keep it all the same?',
  'taped-twice': 'the same person has a tape sheet of the row and day already. Keep both? The newer is used.',
  'feet-and-tenths': 'the places look like feet and tenths, and the tape is given in inches. Are they inches?',
};

/**
 * One question a rule, over all the lines that raise it, each named. What it is about is a mark made from those very
 * questions, so that an answer holds for this set of lines and no other.
 */
export function importQuestions(asked: readonly LineQuestion[]): Question[] {
  return [...new Set(asked.map((each) => each.rule))].map((rule) => {
    const of = asked.filter((each) => each.rule === rule).sort((a, b) => a.line - b.line);
    const about = `${countText(of.length, 'entry', 'entries')}, ${contentHash(of.map((each) => `${each.line} ${each.about}`)).slice(0, 40)}`;
    const [only] = of;
    if (only && of.length === 1) return { rule, about, sentence: `Line ${only.line}: ${only.sentence}` };
    // What is asked stands above the lines once.
    const named = of.slice(0, linesNamed).map((each) => `Line ${each.line}: ${each.sentence.replace(/ [^.]*\?$/, '')}`);
    const rest = of.length > linesNamed ? [`And ${of.length - linesNamed} more.`] : [];
    return { rule, about, sentence: [`In ${of.length} places ${askedTogether[rule] ?? 'a look is needed.'}`, ...named, ...rest].join('\n') };
  });
}
