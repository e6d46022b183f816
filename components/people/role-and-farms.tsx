'use client';

import { FieldMessage } from '@/components/ui/field-message';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { Checkbox } from '@/components/ui/checkbox';
import { RadioGroup } from '@/components/ui/radio-group';
import type { ProblemError } from '@/lib/client/problem-error';
import { roles, type Role } from '@/lib/schemas/vocabulary';
import { peopleTexts } from '@/lib/texts/people-texts';

export type RoleDraft = { role: Role; farmIds: string[] };

type RoleAndFarmsProps = {
  draft: RoleDraft;
  farms: readonly { id: string; name: string }[];
  onChange: (part: Partial<RoleDraft>) => void;
  error: ProblemError | null;
  name: string;
};

/** What somebody is, and which farms they see; owners and agronomists see all, so they are not asked. */
export function RoleAndFarms({ draft, farms, onChange, error, name }: RoleAndFarmsProps) {
  const farmError = fieldError(error, 'farmIds');
  const seesAll = draft.role === 'owner' || draft.role === 'agronomist';
  return (
    <>
      <RadioGroup
        legend={peopleTexts.role}
        name={`${name}-role`}
        id={fieldIdOf('role')}
        value={draft.role}
        error={fieldError(error, 'role')}
        options={roles.map((role) => ({ value: role, label: peopleTexts.roles[role], hint: peopleTexts.roleHints[role] }))}
        onChange={(event) => {
          const role = roles.find((each) => each === event.target.value);
          if (role) onChange({ role });
        }}
      />
      {seesAll ? null : (
        <fieldset id={fieldIdOf('farmIds')} tabIndex={-1} aria-describedby={`${name}-farms-error`}>
          <legend className="text-15 font-bold">{peopleTexts.farms}</legend>
          <p className="text-13 text-ink-soft">{peopleTexts.farmsHint}</p>
          {farms.map((farm) => (
            <Checkbox
              key={farm.id}
              label={farm.name}
              checked={draft.farmIds.includes(farm.id)}
              onChange={(event) =>
                onChange({ farmIds: event.target.checked ? [...draft.farmIds, farm.id] : draft.farmIds.filter((each) => each !== farm.id) })
              }
            />
          ))}
          <FieldMessage id={`${name}-farms-error`} error={farmError} />
        </fieldset>
      )}
    </>
  );
}

/** What is sent: an owner or agronomist is attached to no farm in particular. */
export const roleBody = ({ role, farmIds }: RoleDraft) => ({ role, farmIds: role === 'owner' || role === 'agronomist' ? [] : farmIds });
