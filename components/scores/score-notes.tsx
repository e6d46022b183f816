import { Notice } from '@/components/ui/notice';
import { countText } from '@/lib/format/count-text';
import type { Scores } from '@/lib/schemas/scores';
import { scoreTexts } from '@/lib/texts/score-texts';
import { impossibleWords } from './scored-things';

/** What was left out of the scores, and why: nothing is passed over in silence. */
export function ScoreNotes({ scores: { notes, level } }: { scores: Scores }) {
  const texts = scoreTexts.notes;
  const impossible = notes.impossible.map(({ label, field }) => texts.impossible(label, impossibleWords(field)));
  const others = [
    ...(notes.notCounted.length > 0 ? [texts.notCounted(countText(notes.notCounted.length, 'row sample'), shortList(notes.notCounted))] : []),
    ...(notes.countsNotUsed > 0 ? [texts.notUsed(countText(notes.countsNotUsed, 'count'))] : []),
    ...(notes.rowSamplesOfLostStrips > 0 && level !== 'row-sample' ? [texts.lost(countText(notes.rowSamplesOfLostStrips, 'row sample'))] : []),
  ];
  if (impossible.length + others.length === 0) return null;
  return (
    <div className="flex flex-col gap-3 pb-6">
      {impossible.length > 0 ? (
        <Notice>
          {impossible.map((sentence) => (
            <p key={sentence}>{sentence}</p>
          ))}
        </Notice>
      ) : null}
      {others.length > 0 ? (
        <ul className="flex max-w-reading flex-col text-13 text-ink-soft">
          {others.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}

const named = 8;

function shortList(labels: readonly string[]): string {
  const rest = labels.length - named;
  return `${labels.slice(0, named).join(', ')}${rest > 0 ? ` and ${rest} more` : ''}`;
}
