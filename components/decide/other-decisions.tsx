import { Disclosure } from '@/components/ui/disclosure';
import { Section } from '@/components/ui/section';
import { dateText } from '@/lib/format/date-text';
import type { SignedDecision } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { decisionTexts } from '@/lib/texts/decision-texts';
import { replantTexts } from '@/lib/texts/replant-texts';
import { FrozenDecision } from './frozen-decision';

type OtherDecisionsProps = { decisions: readonly SignedDecision[]; units: UnitSystem };

/** What else was signed for this planting: earlier decisions, and those about other parts of the field. */
export function OtherDecisions({ decisions, units }: OtherDecisionsProps) {
  if (decisions.length === 0) return null;
  const texts = decisionTexts;
  return (
    <Section title={texts.others}>
      {decisions.map((decision) => (
        <Disclosure
          key={decision.id}
          label={texts.otherLine(
            decision.zone?.name ?? replantTexts.wholeField,
            texts.choices[decision.decided].toLowerCase(),
            decision.signedName,
            dateText(decision.signedOn),
          )}
        >
          <FrozenDecision decision={decision} units={units} />
        </Disclosure>
      ))}
    </Section>
  );
}
