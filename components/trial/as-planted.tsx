'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { FormButtons } from '@/components/form/form-buttons';
import { OpeningForm } from '@/components/form/opening-form';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { Refusal } from '@/components/form/refusal';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { trialTexts } from '@/lib/texts/trial-texts';

export type PlantedStrip = {
  id: string;
  number: number;
  plannedSettingId: string;
  asPlanted: { settingId: string | null; reason: string | null } | null;
};

type AsPlantedProps = { trialId: string; strips: readonly PlantedStrip[]; settings: readonly { id: string; name: string }[] };

const isAsPlanned = (strip: PlantedStrip) => strip.asPlanted?.settingId === strip.plannedSettingId;

/** What was really run in each strip: all as planned in one press, or strip by strip with the reason. */
export function AsPlanted({ trialId, strips, settings }: AsPlantedProps) {
  const operation = useAskedOperation();
  const open = strips.filter((strip) => strip.asPlanted === null);
  return (
    <div className="flex flex-col gap-3">
      {open.length > 0 ? <p>{trialTexts.plantedNot}</p> : strips.every(isAsPlanned) ? <p>{trialTexts.plantedDone}</p> : null}
      <Refusal operation={operation} />
      <div className="flex flex-wrap items-start gap-2">
        {open.length > 0 ? (
          <Button
            pending={operation.isPending}
            onClick={() =>
              operation.send({
                noun: 'trials',
                kind: 'trial.as-planted',
                thingId: trialId,
                body: { strips: open.map((strip) => ({ id: v7(), stripId: strip.id, settingId: strip.plannedSettingId, reason: null })) },
              })
            }
          >
            {trialTexts.plantedAll}
          </Button>
        ) : null}
        <OpeningForm
          label={trialTexts.plantedForm}
          form={(close) => <AsPlantedForm trialId={trialId} strips={strips} settings={settings} onDone={close} />}
        />
      </div>
    </div>
  );
}

const lost = 'lost';

function AsPlantedForm({ trialId, strips, settings, onDone }: AsPlantedProps & { onDone: () => void }) {
  const [draft, setDraft] = useState(() =>
    strips.map((strip) => ({
      id: v7(),
      stripId: strip.id,
      settingId: strip.asPlanted ? (strip.asPlanted.settingId ?? lost) : strip.plannedSettingId,
      reason: strip.asPlanted?.reason ?? '',
    })),
  );
  const operation = useAskedOperation({ onApplied: onDone });
  const change = (index: number, part: Partial<(typeof draft)[number]>) =>
    setDraft((before) => before.map((each, place) => (place === index ? { ...each, ...part } : each)));
  return (
    <form
      noValidate
      className="flex w-full flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        operation.send({
          noun: 'trials',
          kind: 'trial.as-planted',
          thingId: trialId,
          body: {
            strips: draft.map((each) => ({
              ...each,
              settingId: each.settingId === lost ? null : each.settingId,
              reason: each.reason.trim() === '' ? null : each.reason,
            })),
          },
        });
      }}
    >
      <Refusal operation={operation} />
      {strips.map((strip, index) => {
        const each = draft[index];
        if (!each) return null;
        return (
          <div key={strip.id} className="grid gap-3 border-b border-rule pb-3 md:grid-cols-2">
            <Field
              label={trialTexts.plantedSetting(String(strip.number))}
              id={fieldIdOf(`strips.${index}.settingId`)}
              error={fieldError(operation.error, `strips.${index}.settingId`)}
            >
              {(wiring) => (
                <Select
                  {...wiring}
                  value={each.settingId}
                  options={[...settings.map(({ id, name }) => ({ value: id, label: name })), { value: lost, label: trialTexts.lost }]}
                  onChange={(event) => change(index, { settingId: event.target.value })}
                />
              )}
            </Field>
            {each.settingId === strip.plannedSettingId ? null : (
              <Field
                label={trialTexts.plantedReason(String(strip.number))}
                id={fieldIdOf(`strips.${index}.reason`)}
                error={fieldError(operation.error, `strips.${index}.reason`)}
              >
                {(wiring) => <TextInput {...wiring} value={each.reason} onChange={(event) => change(index, { reason: event.target.value })} />}
              </Field>
            )}
          </div>
        );
      })}
      <FormButtons label={trialTexts.savePlanted} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}
