'use client';

import { useState } from 'react';
import { Refusal } from '@/components/form/refusal';
import { Button } from '@/components/ui/button';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { peopleTexts } from '@/lib/texts/people-texts';
import { FreshLink } from './fresh-link';

/** Makes the link with which a member who lost a password sets a new one. */
export function ResetLink({ personId, name }: { personId: string; name: string }) {
  const [path, setPath] = useState<string>();
  const operation = useAskedOperation({ onApplied: (answer) => setPath(String(answer.result?.path)) });
  if (path) return <FreshLink path={path} name={name} howTo={peopleTexts.resetHowTo} />;
  return (
    <>
      <Refusal operation={operation} />
      <Button
        look="quiet"
        aria-label={peopleTexts.resetLinkOf(name)}
        pending={operation.isPending}
        onClick={() => operation.send({ noun: 'people', kind: 'person.reset-link', thingId: personId, body: {} })}
      >
        {peopleTexts.resetLink}
      </Button>
    </>
  );
}
