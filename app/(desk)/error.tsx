'use client';

import { PageHead } from '@/components/shell/page-head';
import { Button } from '@/components/ui/button';
import { sessionTexts } from '@/lib/texts/session-texts';

export default function PageError({ reset }: { reset: () => void }) {
  return (
    <main className="mx-auto max-w-page p-6">
      <PageHead
        title={sessionTexts.failed}
        sub={sessionTexts.failedHelp}
        actions={<Button onClick={reset}>{sessionTexts.tryAgain}</Button>}
      />
    </main>
  );
}
