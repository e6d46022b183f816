'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { ProblemSummary } from '@/components/form/problem-summary';
import { ReadingField } from '@/components/form/reading-field';
import { Button } from '@/components/ui/button';
import { RadioGroup } from '@/components/ui/radio-group';
import { useKeptDraft } from '@/lib/client/use-kept-draft';
import { useOperation } from '@/lib/client/use-operation';
import { useWho } from '@/lib/client/who';
import { dateText } from '@/lib/format/date-text';
import type { ReplantAnswer, ReplantFigure } from '@/lib/schemas/replant';
import { unitSystems, type UnitSystem } from '@/lib/schemas/vocabulary';
import { formTexts } from '@/lib/texts/form-texts';
import { replantSheetTexts } from '@/lib/texts/replant-sheet-texts';
import { CostLines } from './cost-lines';
import { figurePath } from './figure-path';
import { FormPart } from './form-part';
import { replantDraftSchema, sheetInputs, standingDraft, type ReplantDraft } from './replant-draft';
import { TypedField } from './typed-field';

type ReplantFormProps = { replant: ReplantAnswer; onSaved: () => void };

/** The grower's own figures. Saved, they are appended as a new version, and the page answers from them at once. */
export function ReplantForm({ replant, onSaved }: ReplantFormProps) {
  const { units, today } = useWho();
  const texts = replantSheetTexts;
  const { basis } = replant;
  const zoneId = basis.zone?.id ?? null;
  const standing = standingDraft(replant, units);
  const [kept, keep] = useKeptDraft(
    `replant-sheet ${basis.plantingId} ${zoneId ?? 'field'}`,
    replantDraftSchema,
  );
  const [sheetId, setSheetId] = useState(() => v7());
  const [attempt, setAttempt] = useState(0);
  const operation = useOperation({
    onApplied: () => {
      keep(() => undefined);
      setSheetId(v7());
      onSaved();
    },
  });
  const draft = kept ?? standing;
  const change = (part: Partial<ReplantDraft>) => keep((before) => ({ ...(before ?? standing), ...part }));
  const submit = () => {
    setAttempt(attempt + 1);
    operation.mutate({
      noun: 'replant-sheets',
      kind: 'replant-sheet.save',
      thingId: sheetId,
      body: { plantingId: basis.plantingId, zoneId, inputs: sheetInputs(draft) },
    });
  };
  const { error } = operation;
  const { typedIn } = draft;
  const typed = (
    figure: ReplantFigure,
    key: 'price' | 'replantOn' | 'extraDrying' | 'insurancePayment' | 'poorChance' | 'poorYield',
  ) => ({
    path: figurePath(figure, typedIn),
    value: draft[key],
    onChange: (value: string) => change({ [key]: value }),
    error,
  });
  const loss = (key: 'gapLoss' | 'unevenLoss') => ({
    path: `inputs.${key}Percent`,
    value: draft[key],
    onChange: (value: string) => change({ [key]: value }),
    error,
  });
  const isNewer = kept !== undefined && replant.sheetSavedBy !== null && standing.begunOn !== kept.begunOn;
  return (
    <form
      noValidate
      className="flex max-w-form flex-col gap-6"
      onSubmit={(event) => {
        event.preventDefault();
        submit();
      }}
    >
      <ProblemSummary error={error} attempt={attempt} />
      {isNewer ? (
        <div role="status" className="flex flex-col items-start gap-2 border-l-6 border-flag pl-4">
          <p>{texts.newer(replant.sheetSavedBy ?? '')}</p>
          <Button look="secondary" onClick={() => keep(() => undefined)}>
            {texts.showNewer}
          </Button>
        </div>
      ) : null}
      <FormPart title={texts.yieldAndPrice}>
        {typedIn === units ? null : (
          <RadioGroup
            legend={texts.typedIn}
            name="typed-in"
            inline
            value={typedIn}
            options={unitSystems.map((value) => ({
              value,
              label: value === 'us' ? texts.typedInUs : texts.typedInMetric,
            }))}
            onChange={(event) => change({ typedIn: event.target.value as UnitSystem })}
          />
        )}
        <ReadingField
          label={texts.fullYield}
          hint={texts.fullYieldHint}
          path={figurePath('fullYield', typedIn)}
          value={draft.fullYield}
          onChange={(fullYield) => change({ fullYield })}
          error={error}
        />
        <TypedField label={texts.price[typedIn]} {...typed('price', 'price')} />
      </FormPart>
      <FormPart title={texts.secondStand}>
        <TypedField
          label={texts.replantOn}
          isDate
          {...typed('replantOn', 'replantOn')}
          {...(draft.replantOn !== '' && draft.replantOn < today
            ? { hint: passedHint(draft.replantOn) }
            : {})}
        />
        <ReadingField
          label={texts.replantStand}
          path={figurePath('replantStand', typedIn)}
          value={draft.replantStand}
          onChange={(replantStand) => change({ replantStand })}
          error={error}
        />
        <TypedField
          label={texts.poorChance}
          hint={texts.poorChanceHint}
          {...typed('poorSecondStandChance', 'poorChance')}
        />
        <TypedField label={texts.poorYield} {...typed('poorSecondStandYield', 'poorYield')} />
      </FormPart>
      <CostLines draft={draft} onChange={(costs) => change({ costs })} error={error} />
      <FormPart>
        <TypedField label={texts.extraDrying[typedIn]} {...typed('extraDrying', 'extraDrying')} />
        <TypedField
          label={texts.insurancePayment[typedIn]}
          hint={texts.insuranceHint}
          {...typed('insurancePayment', 'insurancePayment')}
        />
      </FormPart>
      <FormPart title={texts.present}>
        <TypedField label={texts.gapLoss} hint={texts.gapLossHint} {...loss('gapLoss')} />
        <TypedField label={texts.unevenLoss} hint={texts.unevenLossHint} {...loss('unevenLoss')} />
      </FormPart>
      <Button type="submit" wide pending={operation.isPending} pendingText={formTexts.saving}>
        {texts.save}
      </Button>
    </form>
  );
}

/** A half-typed day is no day yet. */
function passedHint(day: string): string {
  try {
    return replantSheetTexts.replantOnPassed(dateText(day));
  } catch {
    return '';
  }
}
