'use client';

import { useMutation } from '@tanstack/react-query';
import { Button } from '@/components/ui/button';
import { askFirst } from '@/lib/client/round/person-flag';
import { postJson } from '@/lib/client/request';
import { apiPaths, paths } from '@/lib/paths/paths';
import { sessionTexts } from '@/lib/texts/session-texts';

export function SignOutButton() {
  const signOut = useMutation({
    mutationFn: async () => {
      // Loaded only here: the phone's store has no place among the desk pages' scripts.
      const { hasUnsent } = await import('@/lib/client/round/unsent');
      if (await hasUnsent()) return `${paths.round}?at=leave`;
      askFirst();
      await postJson(apiPaths.signOut, {});
      return paths.signIn;
    },
    onSuccess: (to: string) => window.location.assign(to),
  });
  return (
    <Button look="quiet" pending={signOut.isPending} onClick={() => signOut.mutate()}>
      {sessionTexts.signOut}
    </Button>
  );
}
