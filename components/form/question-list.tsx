'use client';

import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import type { Question } from '@/lib/errors/app-error';
import type { Confirmation } from '@/lib/schemas/operation';
import { formTexts } from '@/lib/texts/form-texts';

type QuestionListProps = {
  questions: readonly Question[];
  onConfirm: (confirmations: Confirmation[]) => void;
  pending?: boolean;
  /** How this form says yes, where nobody has seen anything: "Yes, that is right". */
  yes?: string;
};

const keyOf = (question: Question) => `${question.rule} ${question.about}`;

/** What is asked about before an entry is taken. Each question is answered by itself; the answers travel with the entry. */
export function QuestionList({ questions, ...rest }: QuestionListProps) {
  // Another set of questions starts unanswered.
  return <AskedQuestions key={questions.map(keyOf).join('|')} questions={questions} {...rest} />;
}

function AskedQuestions({ questions, onConfirm, pending = false, yes = formTexts.yes }: QuestionListProps) {
  const [answered, setAnswered] = useState<readonly string[]>([]);
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), []);
  const [only, another] = questions;
  const isOne = only !== undefined && another === undefined;
  const confirm = () => onConfirm(questions.map(({ rule, about }) => ({ rule, about, answer: 'yes' })));
  return (
    <div ref={box} tabIndex={-1} role="alert" className="flex max-w-reading flex-col gap-3 border-l-8 border-flag py-2 pl-4 outline-none">
      <p>{isOne ? formTexts.askedLeadOne : formTexts.askedLead}</p>
      {isOne ? <Asked sentence={only.sentence} look="text-18 font-bold" /> : null}
      {isOne ? null : (
        <ul className="flex flex-col gap-3">
          {questions.map((question) => (
            <li key={keyOf(question)} className="border-t border-rule pt-2">
              <Asked sentence={question.sentence} look="font-bold" />
              <Checkbox
                label={yes}
                checked={answered.includes(keyOf(question))}
                onChange={(event) =>
                  setAnswered(
                    event.target.checked
                      ? [...answered, keyOf(question)]
                      : answered.filter((each) => each !== keyOf(question)),
                  )
                }
              />
            </li>
          ))}
        </ul>
      )}
      <div>
        <Button pending={pending} disabled={!isOne && answered.length < questions.length} onClick={confirm}>
          {isOne ? yes : formTexts.yesToAll}
        </Button>
      </div>
    </div>
  );
}

/** What is asked, and below it, line by line, what it is asked about where that is more than one thing. */
function Asked({ sentence, look }: { sentence: string; look: string }) {
  const [asked, ...about] = sentence.split('\n');
  return (
    <>
      <p className={look}>{asked}</p>
      {about.length > 0 ? (
        <ul>
          {about.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      ) : null}
    </>
  );
}
