'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { RadioGroup } from '@/components/ui/radio-group';
import type { ProblemError } from '@/lib/client/problem-error';
import { postJson } from '@/lib/client/request';
import { apiPaths } from '@/lib/paths/paths';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { preferencesTexts } from '@/lib/texts/link-texts';

export function UnitsForm({ units }: { units: UnitSystem }) {
  const router = useRouter();
  const [draft, setDraft] = useState(units);
  const save = useMutation<unknown, ProblemError>({
    mutationFn: () => postJson(apiPaths.preferences, { units: draft }),
    onSuccess: () => router.refresh(),
  });
  return (
    <form
      className="flex max-w-form flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        save.mutate();
      }}
    >
      <ProblemSummary error={save.error} attempt={save.submittedAt} />
      <RadioGroup
        legend={preferencesTexts.units}
        name="units"
        value={draft}
        options={[
          { value: 'us', label: preferencesTexts.us },
          { value: 'metric', label: preferencesTexts.metric },
        ]}
        onChange={(event) => setDraft(event.target.value === 'metric' ? 'metric' : 'us')}
      />
      <div className="flex items-center gap-3">
        <Button type="submit" pending={save.isPending}>
          {preferencesTexts.saveUnits}
        </Button>
        <p role="status">{save.isSuccess ? preferencesTexts.unitsSaved : null}</p>
      </div>
    </form>
  );
}
