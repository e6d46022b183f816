'use client';

import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { fieldError, fieldIdOf, ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import type { ProblemError } from '@/lib/client/problem-error';
import { askFirst } from '@/lib/client/round/person-flag';
import { postJson } from '@/lib/client/request';
import { apiPaths, paths } from '@/lib/paths/paths';
import { sessionTexts } from '@/lib/texts/session-texts';

export function SignInForm() {
  const [draft, setDraft] = useState({ email: '', password: '' });
  const [attempt, setAttempt] = useState(0);
  const signIn = useMutation<unknown, ProblemError>({
    mutationFn: () => postJson(apiPaths.signIn, draft),
    // A whole new page, so that nothing of the person before stays in this tab's memory.
    onSuccess: () => {
      askFirst();
      window.location.assign(new URLSearchParams(window.location.search).get('to') === 'round' ? paths.round : paths.home);
    },
  });
  return (
    <form
      noValidate
      method="post"
      className="flex max-w-reading flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        setAttempt(attempt + 1);
        signIn.mutate();
      }}
    >
      <ProblemSummary error={signIn.error} attempt={attempt} />
      <Field label={sessionTexts.email} id={fieldIdOf('email')} error={fieldError(signIn.error, 'email')}>
        {(wiring) => (
          <TextInput {...wiring} type="email" autoComplete="username" value={draft.email} onChange={(event) => setDraft({ ...draft, email: event.target.value })} />
        )}
      </Field>
      <Field label={sessionTexts.password} id={fieldIdOf('password')} error={fieldError(signIn.error, 'password')}>
        {(wiring) => (
          <TextInput {...wiring} type="password" autoComplete="current-password" value={draft.password} onChange={(event) => setDraft({ ...draft, password: event.target.value })} />
        )}
      </Field>
      <div>
        <Button type="submit" pending={signIn.isPending}>
          {sessionTexts.signIn}
        </Button>
      </div>
      <p className="text-13 text-ink-soft">{sessionTexts.signInHelp}</p>
    </form>
  );
}
