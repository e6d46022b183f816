import { Section } from '@/components/ui/section';
import type { ReplantBasis } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';
import { BreakEven } from './break-even';
import { ReplantSum } from './replant-sum';
import { YieldBars } from './yield-bars';

/** The evidence under the sentence: two bars, the sum, and the stand at which the answer turns. The same live and frozen. */
export function Evidence({ basis, units }: { basis: ReplantBasis; units: UnitSystem }) {
  const { answer } = basis;
  if (answer.kind !== 'value') return null;
  return (
    <>
      <div className="pb-8">
        <YieldBars basis={basis} answer={answer} units={units} />
      </div>
      <Section title={replantTexts.sum.title} lead={replantTexts.sum.lead}>
        <ReplantSum basis={basis} answer={answer} units={units} />
        <BreakEven basis={basis} answer={answer} units={units} />
      </Section>
    </>
  );
}
