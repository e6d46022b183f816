'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { peopleTexts } from '@/lib/texts/people-texts';

/** A link that was just made: the one moment in which it can be read. */
export function FreshLink({ path, name, howTo }: { path: string; name: string; howTo: string }) {
  const [copied, setCopied] = useState(false);
  const address = new URL(path, window.location.href).href;
  return (
    <div className="flex flex-col items-start gap-2 bg-bone p-4" role="status">
      <p className="font-bold">{peopleTexts.linkReady(name)}</p>
      <p className="font-mono text-15 break-all select-all">{address}</p>
      <p>{howTo}</p>
      <Button
        look="secondary"
        onClick={() => {
          // Without a secure context there is no clipboard; the text above can be selected instead.
          void navigator.clipboard?.writeText(address).then(() => setCopied(true));
        }}
      >
        {copied ? peopleTexts.copied : peopleTexts.copy}
      </Button>
    </div>
  );
}
