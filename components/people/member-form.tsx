'use client';

import { FormButtons } from '@/components/form/form-buttons';
import { Refusal } from '@/components/form/refusal';
import { useThingForm } from '@/lib/client/use-thing-form';
import type { Role } from '@/lib/schemas/vocabulary';
import { peopleTexts } from '@/lib/texts/people-texts';
import { RoleAndFarms, roleBody } from './role-and-farms';

export type Member = { personId: string; name: string; email: string; role: Role; version: number; farmIds: string[] };

type MemberFormProps = { member: Member; farms: readonly { id: string; name: string }[]; onDone: () => void };

/** Changes what a member is and which farms they see; it holds from their next click on. */
export function MemberForm({ member, farms, onDone }: MemberFormProps) {
  const form = useThingForm({
    standing: { role: member.role, farmIds: member.farmIds },
    thing: { id: member.personId, version: member.version },
    input: (draft) => ({ noun: 'people', kind: 'person.change-role', body: roleBody(draft) }),
    onApplied: onDone,
  });
  return (
    <form
      noValidate
      className="flex max-w-form flex-col gap-4 py-3"
      onSubmit={(event) => {
        event.preventDefault();
        form.submit();
      }}
    >
      <Refusal operation={form.operation} onShowStanding={form.showStanding} />
      <RoleAndFarms draft={form.draft} farms={farms} onChange={form.change} error={form.operation.error} name={member.personId} />
      <FormButtons label={peopleTexts.save} pending={form.operation.isPending} onCancel={onDone} />
    </form>
  );
}
