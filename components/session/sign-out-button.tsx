'use client';

import { useMutation } from '@tanstack/react-query';
import { Button } from '@/components/ui/button';
import { postJson } from '@/lib/client/request';
import { apiPaths, paths } from '@/lib/paths/paths';
import { sessionTexts } from '@/lib/texts/session-texts';

export function SignOutButton() {
  const signOut = useMutation({
    mutationFn: () => postJson(apiPaths.signOut, {}),
    onSuccess: () => window.location.assign(paths.signIn),
  });
  return (
    <Button look="quiet" pending={signOut.isPending} onClick={() => signOut.mutate()}>
      {sessionTexts.signOut}
    </Button>
  );
}
