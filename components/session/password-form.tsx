'use client';

import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { fieldError, fieldIdOf, ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import type { ProblemError } from '@/lib/client/problem-error';
import { postJson } from '@/lib/client/request';
import { apiPaths } from '@/lib/paths/paths';
import { linkTexts, preferencesTexts } from '@/lib/texts/link-texts';

export function PasswordForm({ email }: { email: string }) {
  const [draft, setDraft] = useState({ current: '', next: '' });
  const change = useMutation<unknown, ProblemError>({
    mutationFn: () => postJson(apiPaths.password, draft),
    onSuccess: () => setDraft({ current: '', next: '' }),
  });
  return (
    <form
      noValidate
      method="post"
      className="flex max-w-form flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        change.mutate();
      }}
    >
      <ProblemSummary error={change.error} attempt={change.submittedAt} />
      {/* A password keeper looks for the name beside the password. */}
      <input type="email" autoComplete="username" value={email} readOnly hidden />
      <Field label={preferencesTexts.present} id={fieldIdOf('current')} error={fieldError(change.error, 'current')}>
        {(wiring) => (
          <TextInput {...wiring} type="password" autoComplete="current-password" value={draft.current} onChange={(event) => setDraft({ ...draft, current: event.target.value })} />
        )}
      </Field>
      <Field label={preferencesTexts.next} hint={linkTexts.passwordHint} id={fieldIdOf('next')} error={fieldError(change.error, 'next')}>
        {(wiring) => (
          <TextInput {...wiring} type="password" autoComplete="new-password" value={draft.next} onChange={(event) => setDraft({ ...draft, next: event.target.value })} />
        )}
      </Field>
      <div className="flex items-center gap-3">
        <Button type="submit" pending={change.isPending}>
          {preferencesTexts.changePassword}
        </Button>
        <p role="status">{change.isSuccess ? preferencesTexts.passwordChanged : null}</p>
      </div>
    </form>
  );
}
