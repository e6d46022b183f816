import { PageHead } from '@/components/shell/page-head';
import { dateText } from '@/lib/format/date-text';
import type { ReplantBasis, SignedDecision } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { decisionTexts } from '@/lib/texts/decision-texts';
import { basisChanges } from './basis-facts';

type SignedHeadProps = {
  decision: SignedDecision;
  current: ReplantBasis;
  hasChanged: boolean;
  units: UnitSystem;
};

/** A signed decision is the finding: who decided what and when, what they read, and whether that still stands so. */
export function SignedHead({ decision, current, hasChanged, units }: SignedHeadProps) {
  const texts = decisionTexts;
  const { decided, signedName, personName, signedOn, basis } = decision;
  return (
    <PageHead
      title={texts.signedFirst[decided](signedName, dateText(signedOn))}
      sub={
        <div className="flex flex-col gap-3">
          <p>
            {texts.answerThen} {basis.sentences?.[units].first}
          </p>
          {signedName === personName ? null : (
            <p className="text-15 text-ink-soft">{texts.signedAs(signedName, personName)}</p>
          )}
          {hasChanged ? (
            <div className="border-l-6 border-flag pl-4">
              <p>{texts.changed}</p>
              <ul className="flex list-disc flex-col gap-1 pl-5 pt-2 text-15">
                {basisChanges(basis, current, units).map((line) => (
                  <li key={line}>{line}</li>
                ))}
              </ul>
            </div>
          ) : (
            <p className="text-15 text-ink-soft">{texts.unchanged}</p>
          )}
        </div>
      }
    />
  );
}
