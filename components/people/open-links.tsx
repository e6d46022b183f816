'use client';

import { RemoveThing } from '@/components/form/remove-thing';
import { dateText } from '@/lib/format/date-text';
import type { LinkPurpose } from '@/lib/schemas/vocabulary';
import { peopleTexts } from '@/lib/texts/people-texts';

type OpenLink = { id: string; purpose: LinkPurpose; name: string | null; email: string | null; expiresOn: string };

/** Links that were made and not used yet; each can be taken back. The links themselves are kept nowhere. */
export function OpenLinks({ links, mayWrite }: { links: readonly OpenLink[]; mayWrite: boolean }) {
  if (links.length === 0) return <p>{peopleTexts.noOpenLinks}</p>;
  return (
    <ul>
      {links.map((link) => {
        const name = link.name ?? link.email ?? '';
        return (
          <li key={link.id} className="flex flex-wrap items-center justify-between gap-x-4 border-b border-rule py-2">
            <p>
              {name}: {peopleTexts.purposes[link.purpose]}, {peopleTexts.openUntil(dateText(link.expiresOn))}
            </p>
            {mayWrite ? (
              <RemoveThing
                noun="people"
                kind="link.revoke"
                thing={{ id: link.id, version: 1 }}
                label={peopleTexts.takeBackOf(name)}
                explanation={peopleTexts.takeBackExplained}
              />
            ) : null}
          </li>
        );
      })}
    </ul>
  );
}
