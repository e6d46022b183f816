'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import type { KeptEntry } from '@/lib/client/round/entry';
import { useRound } from '@/lib/client/round/use-round';
import { Button } from '@/components/ui/button';
import { keptTexts } from '@/lib/texts/kept-texts';
import { entryWords } from './entry-words';
import { standingWords } from './standing-words';

/** One entry that the server did not take, with its reason and what can be done: answer, choose, send again, let go. */
export function NeedsLook({ entry }: { entry: KeptEntry }) {
  const round = useRound();
  const [sure, setSure] = useState(false);
  const { what, where, number } = entryWords(round, entry);
  const answer = entry.answer;
  const standing = answer?.code === 'conflict' ? standingWords(answer.standing) : undefined;
  const questions = answer?.questions ?? [];
  const confirmAll = () =>
    void round.sendAgain(entry, { confirmations: [...entry.confirmations, ...questions.map(({ rule, about }) => ({ rule, about, answer: 'yes' as const }))] });
  const keepMine = async () => {
    const replacesId = answer?.standing?.id;
    if (typeof replacesId !== 'string') return;
    // The standing one is named, so that it is corrected and not doubled; only then the losing one goes.
    await round.keep([
      { kind: entry.kind, version: entry.version, thingId: v7(), body: { ...entry.body, replacesId }, about: { plantingId: entry.plantingId, rowSampleId: entry.rowSampleId }, confirmations: entry.confirmations },
    ]);
    await round.letGo(entry);
  };
  return (
    <div className="flex flex-col gap-2 border-l-6 border-flag pl-3">
      <p className="text-18 font-bold">
        {what}
        {where ? `, ${where}` : ''}
        {number ? `: ${number}` : ''}
      </p>
      <p className="text-15">{[entry.occurred.date, entry.occurred.time].filter(Boolean).join(' ')}</p>
      {standing ? <p className="text-18">{keptTexts.conflict}</p> : <p className="text-18">{answer?.code === 'unknown-kind' ? keptTexts.update : answer?.sentence}</p>}
      {(answer?.fields ?? []).map((field) => (
        <p key={field.path + field.message} className="text-15 font-bold">
          {field.message}
        </p>
      ))}
      {questions.map((question) => (
        <p key={question.rule + question.about} className="text-18 font-bold">
          {question.sentence}
        </p>
      ))}
      {standing ? (
        <dl className="grid grid-cols-2 border-y border-ink text-18">
          <div className="border-r border-ink py-2 pr-2">
            <dt className="text-15">{keptTexts.yours}</dt>
            <dd className="font-mono text-27 font-bold">{number}</dd>
            <dd className="text-13">{[entry.occurred.date, entry.occurred.time].filter(Boolean).join(' ')}</dd>
          </div>
          <div className="py-2 pl-2">
            <dt className="text-15">{keptTexts.theirs(standing.personName)}</dt>
            <dd className="font-mono text-27 font-bold">{standing.number}</dd>
            <dd className="text-13">{standing.when}</dd>
          </div>
        </dl>
      ) : null}
      <div className="flex flex-wrap gap-2">
        {standing ? (
          <>
            <Button onClick={() => void keepMine()}>{keptTexts.keepYours}</Button>
            <Button look="secondary" onClick={() => void round.letGo(entry)}>
              {keptTexts.keepTheirs(standing.personName)}
            </Button>
          </>
        ) : (
          <>
            {questions.length > 0 ? <Button onClick={confirmAll}>{keptTexts.yes}</Button> : null}
            <Button look="secondary" onClick={() => void round.sendAgain(entry)}>
              {keptTexts.again}
            </Button>
            <Button look="secondary" onClick={() => setSure(true)}>
              {keptTexts.letGo}
            </Button>
          </>
        )}
      </div>
      {sure ? (
        <div role="alertdialog" aria-label={keptTexts.letGo} className="flex flex-col gap-2 bg-bone p-3">
          <p className="text-18 font-bold">{keptTexts.letGoSure}</p>
          <div className="flex flex-wrap gap-2">
            <Button look="secondary" onClick={() => setSure(false)}>
              {keptTexts.noLetGo}
            </Button>
            <Button onClick={() => void round.letGo(entry)}>{keptTexts.letGoYes}</Button>
          </div>
        </div>
      ) : null}
    </div>
  );
}
