'use client';

import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { fieldError, fieldIdOf, ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import type { ProblemError } from '@/lib/client/problem-error';
import { postJson } from '@/lib/client/request';
import { apiPaths, paths } from '@/lib/paths/paths';
import type { LinkPurpose } from '@/lib/schemas/vocabulary';
import { linkTexts } from '@/lib/texts/link-texts';
import { sessionTexts } from '@/lib/texts/session-texts';

type LinkFormProps = { secret: string; purpose: LinkPurpose; name: string; hasAccount: boolean };

type Draft = { name: string; email: string; organisationName: string; timeZone: string; password: string };
type Shown = { key: keyof Draft; label: string; hint?: string; type?: string; autoComplete?: string };

function fieldsOf(purpose: LinkPurpose, hasAccount: boolean): Shown[] {
  const password: Shown = hasAccount
    ? { key: 'password', label: linkTexts.presentPassword, type: 'password', autoComplete: 'current-password' }
    : { key: 'password', label: linkTexts.newPassword, hint: linkTexts.passwordHint, type: 'password', autoComplete: 'new-password' };
  const name: Shown = { key: 'name', label: linkTexts.yourName, autoComplete: 'name' };
  if (purpose === 'password-reset' || hasAccount) return [password];
  if (purpose === 'invitation') return [name, password];
  return [
    { key: 'organisationName', label: linkTexts.organisationName, hint: linkTexts.organisationHint, autoComplete: 'organization' },
    name,
    { key: 'email', label: sessionTexts.email, type: 'email', autoComplete: 'username' },
    password,
    { key: 'timeZone', label: linkTexts.timeZone },
  ];
}

/** Asks for what a link of this purpose needs, and goes in with it. Opening the page alone uses nothing up. */
export function LinkForm({ secret, purpose, name, hasAccount }: LinkFormProps) {
  const [draft, setDraft] = useState<Draft>(() => ({
    name,
    email: '',
    organisationName: '',
    timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
    password: '',
  }));
  const [attempt, setAttempt] = useState(0);
  const shown = fieldsOf(purpose, hasAccount);
  const open = useMutation<unknown, ProblemError>({
    mutationFn: () => postJson(apiPaths.openLink, { secret, ...Object.fromEntries(shown.map(({ key }) => [key, draft[key]])) }),
    onSuccess: () => window.location.assign(paths.home),
  });
  return (
    <form
      noValidate
      method="post"
      className="flex flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        setAttempt(attempt + 1);
        open.mutate();
      }}
    >
      <ProblemSummary error={open.error} attempt={attempt} />
      {shown.map(({ key, label, hint, type, autoComplete }) => (
        <Field key={key} label={label} hint={hint} id={fieldIdOf(key)} error={fieldError(open.error, key)}>
          {(wiring) => (
            <TextInput
              {...wiring}
              type={type ?? 'text'}
              autoComplete={autoComplete}
              // The server's zone and the browser's may differ; the browser's is the one to show.
              suppressHydrationWarning={key === 'timeZone'}
              value={draft[key]}
              onChange={(event) => setDraft({ ...draft, [key]: event.target.value })}
            />
          )}
        </Field>
      ))}
      <div>
        <Button type="submit" pending={open.isPending}>
          {linkTexts.open}
        </Button>
      </div>
    </form>
  );
}
