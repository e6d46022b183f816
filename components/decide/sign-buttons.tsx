'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { Notice } from '@/components/ui/notice';
import type { ReplantAnswer } from '@/lib/schemas/replant';
import { decisionChoices, type DecisionChoice } from '@/lib/schemas/vocabulary';
import { decisionTexts } from '@/lib/texts/decision-texts';
import { SignDialog } from './sign-dialog';

type SignButtonsProps = { replant: ReplantAnswer; maySign: boolean; onSigned: () => void };

/** The cautions, and right below them the two presses they are about. */
export function SignButtons({ replant, maySign, onSigned }: SignButtonsProps) {
  const [pressed, setPressed] = useState<{ choice: DecisionChoice; read: ReplantAnswer }>();
  const texts = decisionTexts;
  const { answer } = replant.basis;
  if (answer.kind !== 'value') return null;
  return (
    <div className="flex flex-col gap-4">
      <Disclosure label={texts.alsoAsk}>
        <ul className="flex max-w-reading list-disc flex-col gap-1 pl-5">
          {texts.alsoAskLines.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      </Disclosure>
      <Notice title={texts.cautionsTitle}>
        {texts.cautions.map((caution) => (
          <p key={caution}>{caution}</p>
        ))}
      </Notice>
      {maySign ? (
        <div className="grid max-w-reading grid-cols-2 gap-3" data-print="leave-out">
          {decisionChoices.map((choice) => (
            <Button
              key={choice}
              wide
              look={answer.recommendation === choice ? 'primary' : 'secondary'}
              onClick={() => setPressed({ choice, read: replant })}
            >
              <span className="text-18">{texts.choices[choice]}</span>
            </Button>
          ))}
        </div>
      ) : (
        <div className="max-w-reading border-t border-rule pt-3">
          <p className="text-18 font-bold">{texts.awaits}</p>
          <p>{texts.awaitsHelp}</p>
        </div>
      )}
      {pressed ? (
        <SignDialog
          {...pressed}
          current={replant}
          onClose={() => setPressed(undefined)}
          onSigned={() => {
            setPressed(undefined);
            onSigned();
          }}
        />
      ) : null}
    </div>
  );
}
