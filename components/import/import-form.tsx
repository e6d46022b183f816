'use client';

import { useMemo, useState } from 'react';
import { v7 } from 'uuid';
import { ProblemSummary } from '@/components/form/problem-summary';
import { QuestionList } from '@/components/form/question-list';
import { Button } from '@/components/ui/button';
import { controlClass } from '@/components/ui/control-class';
import { Field } from '@/components/ui/field';
import { LinkButton } from '@/components/ui/link-button';
import { Progress } from '@/components/ui/progress';
import { RadioGroup } from '@/components/ui/radio-group';
import { TextArea } from '@/components/ui/text-area';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import { paths } from '@/lib/paths/paths';
import { importCharactersMost } from '@/lib/schemas/observation';
import { importKinds, type ImportKind } from '@/lib/schemas/vocabulary';
import { importTexts } from '@/lib/texts/import-texts';
import { ImportColumns } from './import-columns';
import { ImportPreview } from './import-preview';
import { ImportProblems } from './import-problems';
import { readImport, type ImportReading } from './import-reading';

type ImportFormProps = { plantingId: string; labels: readonly string[]; exampleDays: readonly [string, string] };
type Chosen = { id: string; name: string; text: string };

const kindOptions = importKinds.map((kind) => ({ value: kind, label: importTexts.kinds[kind], hint: importTexts.kindHints[kind] }));
const nothing: Chosen = { id: '', name: importTexts.pastedName, text: '' };

/** Chooses a file or takes its pasted text, shows what was understood, and takes it in whole. */
export function ImportForm({ plantingId, labels, exampleDays }: ImportFormProps) {
  const { organisationId } = useWho();
  const [kind, setKind] = useState<ImportKind>('counts');
  const [chosen, setChosen] = useState<Chosen>(nothing);
  const [taken, setTaken] = useState<string>();
  const [tooLarge, setTooLarge] = useState<string>();
  const operation = useAskedOperation({
    onApplied: (answer) => {
      setTaken(takenText(kind, answer.result));
      setChosen(nothing);
    },
  });
  const reading = useMemo(() => (chosen.text.trim() === '' ? undefined : readImport(kind, chosen.text)), [kind, chosen.text]);
  const choose = (name: string, text: string) => {
    setTaken(undefined);
    setTooLarge(undefined);
    operation.reset();
    // Another text is another import; the same one sent again after silence is the same one.
    setChosen({ id: v7(), name, text });
  };
  const isAsked = operation.error?.problem.code === 'needs-confirmation';
  const problems = problemsOf(reading, labels, operation.error?.problem.fields.map((field) => field.message) ?? []);
  return (
    <form
      noValidate
      className="flex flex-col gap-6"
      onSubmit={(event) => {
        event.preventDefault();
        operation.send({ noun: 'imports', kind: 'import.take', thingId: chosen.id, body: { plantingId, importKind: kind, fileName: chosen.name, text: chosen.text } });
      }}
    >
      <div className="grid items-start gap-6 lg:grid-cols-2">
        <div className="flex flex-col gap-4">
          <RadioGroup
            legend={importTexts.kindLegend}
            name="import-kind"
            options={kindOptions}
            value={kind}
            onChange={(event) => {
              setKind(event.target.value as ImportKind);
              choose(chosen.name, chosen.text);
            }}
          />
          <Field label={importTexts.chooseFile} error={tooLarge === undefined ? undefined : importTexts.tooLarge(tooLarge)} hint={chosen.text !== '' && chosen.name !== importTexts.pastedName ? importTexts.chosen(chosen.name) : undefined}>
            {(wiring) => (
              <input
                {...wiring}
                type="file"
                accept=".csv,.txt,.tsv,text/csv,text/plain"
                className={`${controlClass} cursor-pointer`}
                onChange={async (event) => {
                  const input = event.target;
                  const file = input.files?.[0];
                  if (!file) return;
                  // What is far too long is not read into the page at all.
                  if (file.size > importCharactersMost) setTooLarge(file.name);
                  else choose(file.name, await file.text());
                  // So that the same file, mended, can be chosen again.
                  input.value = '';
                }}
              />
            )}
          </Field>
          <Field label={importTexts.orPaste}>
            {(wiring) => (
              <TextArea {...wiring} rows={8} spellCheck={false} value={chosen.text} onChange={(event) => choose(importTexts.pastedName, event.target.value)} />
            )}
          </Field>
        </div>
        <ImportColumns kind={kind} labels={labels} exampleDays={exampleDays} />
      </div>
      {reading ? <ImportPreview reading={reading} /> : null}
      <ImportProblems problems={problems} />
      {operation.error && problems.length === 0 ? (
        isAsked ? (
          <QuestionList questions={operation.error.problem.questions} onConfirm={operation.confirm} pending={operation.isPending} yes={importTexts.yes} />
        ) : (
          <ProblemSummary error={operation.error} attempt={operation.attempt} />
        )
      ) : null}
      {operation.isPending && reading ? <Progress label={importTexts.working} share={null} text={importTexts.workingText(countText(linesOf(reading), 'line'))} /> : null}
      {reading && problems.length === 0 && !isAsked ? (
        <div>
          <Button type="submit" pending={operation.isPending} pendingText={importTexts.working}>
            {importTexts.take(whatOf(reading))}
          </Button>
        </div>
      ) : null}
      <div role="status" className="flex flex-col items-start gap-3 text-18 font-bold empty:hidden">
        {taken ? (
          <>
            <p>{taken}</p>
            <LinkButton look="secondary" href={paths.count(organisationId, plantingId)}>{importTexts.toCounts}</LinkButton>
          </>
        ) : null}
      </div>
    </form>
  );
}

const linesOf = ({ read }: ImportReading) => (read.kind === 'counts' ? read.lines.length : read.sheets.reduce((sum, sheet) => sum + sheet.places.length, 0));

const whatOf = ({ read }: ImportReading) => (read.kind === 'counts' ? countText(read.lines.length, 'count') : countText(read.sheets.length, 'tape sheet'));

function takenText(kind: ImportKind, result: Record<string, unknown> | undefined): string {
  const records = countText(Number(result?.records ?? 0), kind === 'counts' ? 'count' : 'tape sheet');
  return typeof result?.rowSamples === 'number' ? importTexts.taken(records, countText(result.rowSamples, 'row sample')) : importTexts.takenRecords(records);
}

/** What the reader here finds wrong, and labels that are not in the planting; once that is mended, what the server finds. */
function problemsOf(reading: ImportReading | undefined, labels: readonly string[], fromServer: readonly string[]): readonly string[] {
  if (!reading) return [];
  const known = new Set(labels.map((label) => label.toLowerCase()));
  const unknown = reading.rowSamples.filter((label) => !known.has(label.toLowerCase()));
  const here = reading.problems.map(({ line, column, message }) => `${line === null ? importTexts.wholeFile : importTexts.problemAt(String(line), column ?? '')}: ${message}`);
  const all = unknown.length > 0 ? [...here, importTexts.unknownLabels(unknown.map((label) => `"${label}"`).join(', '))] : here;
  return fromServer.length > 0 && here.length === 0 ? fromServer : all;
}
