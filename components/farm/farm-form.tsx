'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { fieldError, fieldIdOf, ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { useOperation } from '@/lib/client/use-operation';
import { farmTexts } from '@/lib/texts/farm-texts';

type FarmFormProps = {
  timeZone: string;
  farm?: { id: string; name: string; timeZone: string; version: number };
  onSaved?: () => void;
};

/** Adds a farm, or changes one. What was typed stays until the server has taken it. */
export function FarmForm({ timeZone, farm, onSaved }: FarmFormProps) {
  const [draft, setDraft] = useState({ name: farm?.name ?? '', timeZone: farm?.timeZone ?? timeZone });
  const [attempt, setAttempt] = useState(0);
  const operation = useOperation({
    onApplied: () => {
      if (!farm) setDraft({ name: '', timeZone });
      onSaved?.();
    },
  });
  const send = () => {
    setAttempt(attempt + 1);
    operation.mutate({
      noun: 'farms',
      kind: farm ? 'farm.change' : 'farm.add',
      thingId: farm?.id ?? v7(),
      baseVersion: farm?.version ?? null,
      body: draft,
    });
  };
  return (
    <form
      noValidate
      className="flex max-w-reading flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      <ProblemSummary error={operation.error} attempt={attempt} />
      <Field label={farmTexts.name} id={fieldIdOf('name')} error={fieldError(operation.error, 'name')}>
        {(wiring) => (
          <TextInput {...wiring} value={draft.name} onChange={(event) => setDraft({ ...draft, name: event.target.value })} />
        )}
      </Field>
      <Field
        label={farmTexts.timeZone}
        hint={farmTexts.timeZoneHint}
        id={fieldIdOf('timeZone')}
        error={fieldError(operation.error, 'timeZone')}
      >
        {(wiring) => (
          <TextInput
            {...wiring}
            value={draft.timeZone}
            onChange={(event) => setDraft({ ...draft, timeZone: event.target.value })}
          />
        )}
      </Field>
      <div>
        <Button type="submit" pending={operation.isPending}>
          {farm ? farmTexts.save : farmTexts.add}
        </Button>
      </div>
    </form>
  );
}
