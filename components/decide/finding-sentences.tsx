import type { ReplantSentencesShown } from '@/lib/schemas/replant';

/** What follows the first sentence: a bound and zones that say otherwise at once, then how sure it is. */
export function FindingSentences({ sentences }: { sentences: ReplantSentencesShown }) {
  return (
    <div className="flex flex-col gap-3">
      {sentences.bound ? <p className="border-l-6 border-flag pl-4">{sentences.bound}</p> : null}
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
