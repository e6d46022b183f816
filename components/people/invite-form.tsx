'use client';

import { useState } from 'react';
import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { Refusal } from '@/components/form/refusal';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { v7 } from 'uuid';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { peopleTexts } from '@/lib/texts/people-texts';
import { FreshLink } from './fresh-link';
import { RoleAndFarms, roleBody, type RoleDraft } from './role-and-farms';

type Draft = RoleDraft & { email: string; name: string };
const empty: Draft = { email: '', name: '', role: 'scout', farmIds: [] };

/** Invites somebody: the answer carries the link, which is shown once. */
export function InviteForm({ farms }: { farms: readonly { id: string; name: string }[] }) {
  const [draft, setDraft] = useState<Draft>(empty);
  const [made, setMade] = useState<{ path: string; name: string }>();
  const operation = useAskedOperation({
    onApplied: (answer) => {
      setMade({ path: String(answer.result?.path), name: draft.name });
      setDraft(empty);
    },
  });
  const change = (part: Partial<Draft>) => setDraft((before) => ({ ...before, ...part }));
  return (
    <form
      noValidate
      className="flex max-w-form flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        const { email, name } = draft;
        operation.send({ noun: 'people', kind: 'person.invite', thingId: v7(), body: { email, name, ...roleBody(draft) } });
      }}
    >
      {made ? <FreshLink {...made} howTo={peopleTexts.linkHowTo} /> : null}
      <Refusal operation={operation} />
      <Field label={peopleTexts.name} id={fieldIdOf('name')} error={fieldError(operation.error, 'name')}>
        {(wiring) => <TextInput {...wiring} autoComplete="off" value={draft.name} onChange={(event) => change({ name: event.target.value })} />}
      </Field>
      <Field label={peopleTexts.email} id={fieldIdOf('email')} error={fieldError(operation.error, 'email')}>
        {(wiring) => (
          <TextInput {...wiring} type="email" autoComplete="off" value={draft.email} onChange={(event) => change({ email: event.target.value })} />
        )}
      </Field>
      <RoleAndFarms draft={draft} farms={farms} onChange={change} error={operation.error} name="invite" />
      <FormButtons label={peopleTexts.invite} pending={operation.isPending} />
    </form>
  );
}
