'use client';

import { useState } from 'react';
import { z } from 'zod';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { FormError } from '@/components/ui/form-error';
import { Progress } from '@/components/ui/progress';
import { Section } from '@/components/ui/section';
import { postJson } from '@/lib/client/request';
import { apiPaths } from '@/lib/paths/paths';
import { keptFileMark, keptFileVersion } from '@/lib/schemas/kept-file';
import { answerSchema, type Answer } from '@/lib/schemas/operation';
import { keptFileTexts } from '@/lib/texts/kept-file-texts';
import { keptTexts } from '@/lib/texts/kept-texts';

const keptFileSchema = z.object({
  what: z.literal(keptFileMark),
  version: z.number(),
  person: z.object({ id: z.string(), name: z.string() }),
  operations: z.array(z.record(z.string(), z.unknown())),
  photos: z.array(z.object({ photoId: z.uuid(), organisationId: z.string(), base64: z.string() })),
});
type ReadFile = z.output<typeof keptFileSchema>;

const answersSchema = z.object({ answers: z.array(answerSchema) });
const batch = 100;

type Outcome = { done: number; all: number; answers: Answer[]; photosTaken: number; stopped: boolean; finished: boolean };

/** Reads a phone's file, shows what is in it, sends it in parts and says of each entry what became of it. */
export function KeptFileReader({ org }: { org: string }) {
  const [file, setFile] = useState<ReadFile>();
  const [problem, setProblem] = useState<string>();
  const [outcome, setOutcome] = useState<Outcome>();
  const mine = file?.operations.filter((operation) => operation.organisationId === org) ?? [];
  const photos = file?.photos.filter((photo) => photo.organisationId === org) ?? [];
  const others = (file?.operations.length ?? 0) - mine.length;

  const choose = async (chosen: File | undefined) => {
    setFile(undefined);
    setOutcome(undefined);
    setProblem(undefined);
    if (!chosen) return;
    try {
      const parsed = keptFileSchema.safeParse(JSON.parse(await chosen.text()));
      if (!parsed.success) setProblem(keptFileTexts.notOurs);
      else if (parsed.data.version !== keptFileVersion) setProblem(keptFileTexts.newer);
      else setFile(parsed.data);
    } catch {
      setProblem(keptFileTexts.notOurs);
    }
  };

  const read = async () => {
    const all = mine.length + photos.length;
    let now: Outcome = { done: 0, all, answers: [], photosTaken: 0, stopped: false, finished: false };
    const tell = (part: Partial<Outcome>) => {
      now = { ...now, ...part };
      setOutcome(now);
    };
    tell({});
    try {
      for (let from = 0; from < mine.length; from += batch) {
        const { answers } = answersSchema.parse(await postJson(apiPaths.keptFiles(org), { operations: mine.slice(from, from + batch) }));
        tell({ answers: [...now.answers, ...answers], done: Math.min(mine.length, from + batch) });
      }
      for (const photo of photos) {
        const bytes = Uint8Array.from(atob(photo.base64), (letter) => letter.charCodeAt(0));
        const response = await fetch(apiPaths.photo(org, photo.photoId), { method: 'PUT', headers: { 'Content-Type': 'image/jpeg' }, body: bytes });
        tell({ done: now.done + 1, photosTaken: now.photosTaken + (response.ok ? 1 : 0) });
      }
      tell({ finished: true });
    } catch {
      tell({ stopped: true });
    }
  };

  const refused = outcome?.answers.filter((answer) => answer.outcome === 'refused' || answer.outcome === 'conflict') ?? [];
  const count = (which: Answer['outcome']) => outcome?.answers.filter((answer) => answer.outcome === which).length ?? 0;
  const kindOf = (operationId: string) => {
    const kind = mine.find((operation) => operation.operationId === operationId)?.kind;
    return typeof kind === 'string' ? (keptTexts.kinds[kind] ?? kind) : '';
  };
  return (
    <div className="flex max-w-form flex-col gap-4">
      <Field label={keptFileTexts.choose} hint={keptFileTexts.hint}>
        {(wiring) => <input {...wiring} type="file" accept="application/json,.json" onChange={(event) => void choose(event.target.files?.[0])} className="min-h-press max-w-full py-2" />}
      </Field>
      {problem ? <FormError title={problem} /> : null}
      {file ? (
        <>
          <p className="text-18">{keptFileTexts.what(mine.length, photos.length, file.person.name)}</p>
          {others > 0 ? <p>{keptFileTexts.otherOrganisation(others)}</p> : null}
          <div>
            <Button onClick={() => void read()} pending={outcome !== undefined && !outcome.finished && !outcome.stopped} pendingText={keptFileTexts.reading} disabled={mine.length + photos.length === 0}>
              {keptFileTexts.read}
            </Button>
          </div>
        </>
      ) : null}
      {outcome ? (
        <Section title={outcome.finished ? keptFileTexts.done(count('applied'), count('duplicate'), refused.length) : keptFileTexts.reading}>
          <Progress label={keptFileTexts.read} share={outcome.all === 0 ? 1 : outcome.done / outcome.all} text={keptFileTexts.progress(outcome.done, outcome.all)} />
          {outcome.stopped ? <p role="alert" className="font-bold">{keptFileTexts.stopped}</p> : null}
          {outcome.finished && photos.length > 0 ? <p>{keptFileTexts.photosDone(outcome.photosTaken, photos.length)}</p> : null}
          {refused.length > 0 ? (
            <ul aria-label={keptFileTexts.notTaken}>
              {refused.map((answer) => (
                <li key={answer.operationId} className="border-b border-rule py-2">
                  <span className="font-bold">{kindOf(answer.operationId)}.</span> {answer.sentence} {(answer.fields ?? []).map((field) => field.message).join(' ')} {(answer.questions ?? []).map((question) => question.sentence).join(' ')}
                </li>
              ))}
            </ul>
          ) : null}
        </Section>
      ) : null}
    </div>
  );
}
