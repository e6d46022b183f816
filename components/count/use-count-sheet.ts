'use client';

import { useState } from 'react';
import { useKeptDraft } from '@/lib/client/use-kept-draft';
import { useOperationBatch } from '@/lib/client/use-operation-batch';
import type { Answer, Confirmation } from '@/lib/schemas/operation';
import { correctingLine, countOperation, countSheetSchema, emptyLine, type CountLine, type CountSheet } from './count-line-draft';
import type { SheetCount } from './row-sheet-types';

type CountSheetInput = { rowSampleId: string; today: string; me: string };

const isUntouched = (line: CountLine) =>
  line.plants.trim() === '' && line.doubtful.trim() === '' && line.marker.trim() === '' && line.corrects === null;
const isTaken = (answer: Answer | undefined) => answer?.outcome === 'applied' || answer?.outcome === 'duplicate';
const inVisitOrder = (a: CountLine, b: CountLine) => (`${a.date} ${a.time}` < `${b.date} ${b.time}` ? -1 : 1);

/** The first line stands before anything was typed; it gets an id of its own with the first letter. */
const unnamed = 'first';
const named = (line: CountLine, today: string): CountLine =>
  line.countId === unnamed ? { ...line, countId: emptyLine(today, undefined).countId } : line;

/**
 * The lines being typed in for one row sample: kept until saved, sent together in the order of their visits, each answered
 * for itself. A line that was not taken stays with its reason; the others leave the sheet.
 */
export function useCountSheet({ rowSampleId, today, me }: CountSheetInput) {
  const [kept, keep] = useKeptDraft<CountSheet>(`count ${rowSampleId}`, countSheetSchema);
  const batch = useOperationBatch();
  const [blank] = useState(() => ({ ...emptyLine(today, undefined), countId: unnamed }));
  const [answers, setAnswers] = useState<ReadonlyMap<string, Answer>>(new Map());
  const [savedLines, setSavedLines] = useState(0);

  const sheetOf = (standing: CountSheet | undefined): CountSheet =>
    standing && standing.lines.length > 0 ? standing : { personId: standing?.personId ?? me, lines: [blank] };
  const sheet = sheetOf(kept);
  const changeLines = (change: (lines: CountLine[]) => CountLine[]) =>
    keep((standing) => ({ ...sheetOf(standing), lines: change(sheetOf(standing).lines) }));

  const filled = sheet.lines.filter((line) => !isUntouched(line));
  // Where nothing was typed, the first line goes out all the same, so that its field is named.
  const toSave = filled.length > 0 ? filled : sheet.lines.slice(0, 1);

  const send = async (lines: readonly CountLine[], confirmations: Confirmation[] = []) => {
    const sent = lines.map((line) => named(line, today)).sort(inVisitOrder);
    if (lines[0]?.countId === unnamed) changeLines(() => sent);
    const inputs = sent.map((line) => ({ ...countOperation(line, rowSampleId, sheet.personId), confirmations }));
    const answered = await batch.mutateAsync(inputs).catch(() => undefined);
    if (!answered) return;
    changeLines((standing) => standing.filter((line) => !isTaken(answered.get(line.countId))));
    setAnswers((before) => new Map([...before, ...answered].filter(([, answer]) => !isTaken(answer))));
    setSavedLines([...answered.values()].filter(isTaken).length);
  };

  return {
    lines: sheet.lines,
    personId: sheet.personId,
    toSave,
    answers,
    savedLines,
    isPending: batch.isPending,
    error: batch.error,
    setPerson: (personId: string) => keep((standing) => ({ ...sheetOf(standing), personId })),
    change: (index: number, line: CountLine) => {
      setAnswers((before) => new Map([...before].filter(([id]) => id !== line.countId)));
      changeLines((lines) => lines.map((each, at) => (at === index ? named(line, today) : each)));
    },
    add: () => {
      const added = emptyLine(today, sheet.lines.at(-1));
      changeLines((lines) => [...lines.map((line) => named(line, today)), added]);
      return added.countId;
    },
    correct: (count: SheetCount, said: string) => {
      const line = correctingLine(count, said);
      changeLines((lines) => [...lines.filter((each) => !isUntouched(each) && each.corrects?.id !== count.id), line]);
      return line.countId;
    },
    remove: (index: number) => changeLines((lines) => lines.filter((_, at) => at !== index)),
    save: () => send(toSave),
    confirm: (line: CountLine, confirmations: Confirmation[]) => send([line], confirmations),
  };
}
export type CountSheetState = ReturnType<typeof useCountSheet>;
