import type { Metadata } from 'next';
import { MethodEntry } from '@/components/methods/method-entry';
import { methodGroups } from '@/components/methods/method-groups';
import { MethodsFrame } from '@/components/methods/methods-frame';
import { TryForm } from '@/components/methods/try-form';
import { tryNames } from '@/components/methods/try-names';
import { PageHead } from '@/components/shell/page-head';
import { Section } from '@/components/ui/section';
import { methodTexts } from '@/lib/texts/method-texts';
import { navigationTexts } from '@/lib/texts/navigation-texts';

export const metadata: Metadata = { title: navigationTexts.methods };

/** How every figure is worked out, for anyone who wants to work it out again; nobody has to sign in for it. */
export default function MethodsPage() {
  const groups = methodGroups();
  const contents = [{ id: 'try', title: methodTexts.groups.try }, ...groups];
  return (
    <MethodsFrame>
      <PageHead title={methodTexts.title} sub={methodTexts.lead} />
      <nav aria-label={methodTexts.contents} className="pb-8" data-print="leave-out">
        <ul className="flex flex-wrap gap-x-6">
          {contents.map((group) => (
            <li key={group.id}>
              <a href={`#${group.id}`} className="flex min-h-press items-center text-15 underline underline-offset-4">
                {group.title}
              </a>
            </li>
          ))}
        </ul>
      </nav>
      <Section id="try" title={methodTexts.groups.try} lead={methodTexts.tryLead}>
        <div className="grid gap-x-10 md:grid-cols-2 xl:grid-cols-3">
          {tryNames.map((name) => (
            <TryForm key={name} name={name} />
          ))}
        </div>
      </Section>
      {groups.map((group) => (
        <Section key={group.id} id={group.id} title={group.title} lead={isOfStudies(group.id) ? methodTexts.studies : undefined}>
          <div>
            {group.entries.map((entry) => (
              <MethodEntry key={entry.id} entry={entry} />
            ))}
          </div>
        </Section>
      ))}
    </MethodsFrame>
  );
}

const isOfStudies = (id: string) => id === 'late' || id === 'uneven';
