import type { ReplantSentencesShown } from '@/lib/schemas/replant';

type FindingSentencesProps = {
  sentences: ReplantSentencesShown;
  /** Said of the sum as it stands now, not of a frozen one. */
  passed?: string | null;
};

/** What follows the first sentence: a bound, a day that has passed and zones that say otherwise at once, then how sure it is. */
export function FindingSentences({ sentences, passed = null }: FindingSentencesProps) {
  return (
    <div className="flex flex-col gap-3">
      {sentences.bound ? <p className="border-l-6 border-flag pl-4">{sentences.bound}</p> : null}
      {passed ? <p className="border-l-6 border-flag pl-4 font-bold">{passed}</p> : null}
      {sentences.zones.map((sentence) => (
        <p key={sentence} className="border-l-6 border-flag pl-4 font-bold">
          {sentence}
        </p>
      ))}
      {sentences.sureness.map((sentence, index) => (
        <p key={sentence} className={index === 0 ? '' : 'text-15 text-ink-soft'}>
          {sentence}
        </p>
      ))}
    </div>
  );
}
