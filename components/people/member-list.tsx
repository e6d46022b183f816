'use client';

import { OpeningForm } from '@/components/form/opening-form';
import { RemoveThing } from '@/components/form/remove-thing';
import { peopleTexts } from '@/lib/texts/people-texts';
import { MemberForm, type Member } from './member-form';
import { ResetLink } from './reset-link';

type MemberListProps = { members: readonly Member[]; farms: readonly { id: string; name: string }[]; mayWrite: boolean };

/** Who belongs here, as what, and which farms they see. */
export function MemberList({ members, farms, mayWrite }: MemberListProps) {
  return (
    <ul className="flex flex-col">
      {members.map((member) => (
        <li key={member.personId} className="flex flex-col gap-1 border-b border-rule py-3">
          <p>
            <span className="font-bold">{member.name}</span>, {peopleTexts.roles[member.role]}
          </p>
          <p className="text-13 text-ink-soft">
            {member.email}; {farmsText(member, farms)}
          </p>
          {mayWrite ? (
            <div className="flex flex-wrap gap-x-3">
              <OpeningForm
                label={peopleTexts.change}
                accessibleLabel={peopleTexts.changeOf(member.name)}
                look="quiet"
                form={(close) => <MemberForm member={member} farms={farms} onDone={close} />}
              />
              <ResetLink personId={member.personId} name={member.name} />
              <RemoveThing
                noun="people"
                kind="person.remove"
                thing={{ id: member.personId, version: member.version }}
                label={peopleTexts.remove(member.name)}
                explanation={peopleTexts.removeExplained}
              />
            </div>
          ) : null}
        </li>
      ))}
    </ul>
  );
}

function farmsText(member: Member, farms: readonly { id: string; name: string }[]): string {
  if (member.role === 'owner' || member.role === 'agronomist') return peopleTexts.allFarms;
  return farms.filter((farm) => member.farmIds.includes(farm.id)).map((farm) => farm.name).join(', ');
}
