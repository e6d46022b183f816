'use client';

import { useId, useState } from 'react';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextArea } from '@/components/ui/text-area';
import type { TryDefinition } from './try-definition';
import { tryDegreeDays } from './try-degree-days';
import { tryLatePlants } from './try-late-plants';
import type { TryName } from './try-names';
import { tryRowLength } from './try-row-length';
import { trySpacing } from './try-spacing';
import { tryStand } from './try-stand';
import { tryYieldGrid } from './try-yield-grid';

const definitions: Record<TryName, TryDefinition> = {
  spacing: trySpacing,
  'plants-per-acre': tryStand,
  'late-plants': tryLatePlants,
  'yield-grid': tryYieldGrid,
  'row-length': tryRowLength,
  'degree-days': tryDegreeDays,
};

/** A formula to try: the answer follows what is typed. A name comes in, because a server page cannot hand over a function. */
export function TryForm({ name }: { name: TryName }) {
  return <TryDefined definition={definitions[name]} />;
}

function TryDefined({ definition }: { definition: TryDefinition }) {
  const [values, setValues] = useState<Record<string, string>>(() =>
    Object.fromEntries(definition.fields.map((field) => [field.key, field.initial])),
  );
  const id = useId();
  const answer = definition.answer(values);
  const change = (key: string) => (event: { target: { value: string } }) =>
    setValues((before) => ({ ...before, [key]: event.target.value }));
  return (
    <form
      aria-labelledby={`${id}title`}
      onSubmit={(event) => event.preventDefault()}
      className="flex min-w-0 flex-col gap-3 border-t border-ink pt-3 pb-6"
    >
      <h3 id={`${id}title`} className="text-18">
        {definition.title}
      </h3>
      <div className="grid grid-cols-2 gap-3">
        {definition.fields.map((field) => (
          <div key={field.key} className={field.kind === 'lines' ? 'col-span-2' : 'min-w-0'}>
            <Field
              label={field.label}
              {...(field.unit ? { unit: field.unit } : {})}
              error={answer.kind === 'wrong' && answer.field === field.key ? answer.message : undefined}
            >
              {(wiring) => {
                const wired = { ...wiring, value: values[field.key] ?? '', onChange: change(field.key) };
                if (field.kind === 'choice') return <Select {...wired} options={field.choices ?? []} />;
                return field.kind === 'lines' ? <TextArea {...wired} rows={2} /> : <NumberInput {...wired} />;
              }}
            </Field>
          </div>
        ))}
      </div>
      <div role="status" className="flex flex-col gap-1">
        {answer.kind === 'answer' ? (
          <>
            <p className="text-21 font-bold">{answer.text}</p>
            {answer.facts ? (
              <dl className="border-t border-rule">
                {answer.facts.map((fact) => (
                  <div key={fact.name} className="flex flex-wrap justify-between gap-x-4 border-b border-rule py-1">
                    <dt className="text-15">{fact.name}</dt>
                    <dd className="font-mono text-15">{fact.text}</dd>
                  </div>
                ))}
              </dl>
            ) : null}
            {answer.detail ? <p className="text-13 text-ink-soft">{answer.detail}</p> : null}
          </>
        ) : answer.kind === 'insufficient' ? (
          <p className="text-15 font-bold">{answer.text}</p>
        ) : null}
      </div>
      <p className="mt-auto text-13 text-ink-soft">{definition.source}</p>
    </form>
  );
}
