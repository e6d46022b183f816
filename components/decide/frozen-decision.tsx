import type { SignedDecision } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { Evidence } from './evidence';
import { FindingSentences } from './finding-sentences';
import { RestsOn } from './rests-on';

type FrozenDecisionProps = { decision: SignedDecision; units: UnitSystem };

/** Everything a decision rested on, from its own frozen numbers and none of today's. */
export function FrozenDecision({ decision, units }: FrozenDecisionProps) {
  const { basis, signedOn } = decision;
  const sentences = basis.sentences?.[units];
  return (
    <div className="border-l-6 border-bone pl-4">
      {sentences ? (
        <div className="flex max-w-reading flex-col gap-3 pb-6">
          <p className="text-18 font-bold">{sentences.first}</p>
          <FindingSentences sentences={sentences} />
        </div>
      ) : null}
      <Evidence basis={basis} units={units} />
      <div className="flex flex-col gap-4">
        <RestsOn basis={basis} units={units} today={signedOn} />
      </div>
    </div>
  );
}
