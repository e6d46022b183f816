import { trialTexts } from '@/lib/texts/trial-texts';

export type MappedStrip = {
  id: string;
  blockNumber: number;
  number: number;
  setting: string;
  /** What was really run, where it differs. */
  instead: string | null;
  isReference: boolean;
};

/** The strips in field order, block by block, as one would walk past them. */
export function StripMap({ strips }: { strips: readonly MappedStrip[] }) {
  const blocks = [...new Set(strips.map((strip) => strip.blockNumber))];
  return (
    <div className="overflow-x-auto" role="group" tabIndex={0} aria-label={trialTexts.title}>
      <ol className="flex min-w-fit flex-col gap-3">
        {blocks.map((block) => (
          <li key={block}>
            <p className="text-13 font-bold">{trialTexts.block(String(block))}</p>
            <ol className="flex border-2 border-ink">
              {strips
                .filter((strip) => strip.blockNumber === block)
                .map((strip) => (
                  <li
                    key={strip.id}
                    className={`flex min-h-20 min-w-20 flex-1 flex-col gap-1 border-l border-ink p-2 first:border-l-0 ${strip.isReference ? 'bg-bone' : ''}`}
                  >
                    <span className="font-mono text-13">{trialTexts.strip(String(strip.number))}</span>
                    <span className={`text-13 font-bold ${strip.instead ? 'line-through' : ''}`}>{strip.setting}</span>
                    {strip.instead ? <span className="text-13 font-bold text-flag-text">{strip.instead}</span> : null}
                    {strip.isReference ? <span className="text-13">{trialTexts.isReference}</span> : null}
                  </li>
                ))}
            </ol>
          </li>
        ))}
      </ol>
    </div>
  );
}
