'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { Refusal } from '@/components/form/refusal';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { FieldMessage } from '@/components/ui/field-message';
import { Notice } from '@/components/ui/notice';
import { RadioGroup } from '@/components/ui/radio-group';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { oneInText } from '@/lib/format/one-in-text';
import { blocksMost } from '@/lib/schemas/trial';
import { comparisonRules, mainFigures } from '@/lib/schemas/vocabulary';
import { trialTexts } from '@/lib/texts/trial-texts';
import { StripMap } from './strip-map';
import { drawnLayout, freshSeed, trialBody, type TrialDraft } from './trial-draft';

type TrialFormProps = {
  plantingId: string;
  settings: readonly { id: string; name: string }[];
  /** The unlocked layout that this one would take the place of. */
  standing: { id: string; studyId: string; draft: Omit<TrialDraft, 'randomSeed'> } | null;
  onDone?: () => void;
};

/** Chooses what is compared and draws the layout by chance, in sight; nothing is kept until it is saved. */
export function TrialForm({ plantingId, settings, standing, onDone }: TrialFormProps) {
  const [draft, setDraft] = useState<TrialDraft>(() => ({
    studyName: '',
    settingIds: [],
    referenceSettingId: '',
    mainFigure: 'spread-days',
    comparisonRule: 'tukey',
    blocks: 4,
    ...standing?.draft,
    randomSeed: freshSeed(),
  }));
  const operation = useAskedOperation({ onApplied: () => onDone?.() });
  const { error } = operation;
  const change = (part: Partial<TrialDraft>) => setDraft((before) => ({ ...before, ...part }));
  const nameOf = (id: string) => settings.find((setting) => setting.id === id)?.name ?? '';
  const drawn = drawnLayout(draft);
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        const body = trialBody(draft, plantingId, standing?.studyId ?? v7(), standing?.id ?? null);
        operation.send({ noun: 'trials', kind: 'trial.lay-out', thingId: v7(), body });
      }}
    >
      <Refusal operation={operation} />
      <div className="flex max-w-form flex-col gap-4">
        <Field label={trialTexts.studyName} hint={trialTexts.studyHint} id={fieldIdOf('studyName')} error={fieldError(error, 'studyName')}>
          {(wiring) => <TextInput {...wiring} value={draft.studyName} onChange={(event) => change({ studyName: event.target.value })} />}
        </Field>
        <fieldset id={fieldIdOf('settingIds')} tabIndex={-1}>
          <legend className="text-15 font-bold">{trialTexts.settings}</legend>
          {settings.map((setting) => (
            <Checkbox
              key={setting.id}
              label={setting.name}
              checked={draft.settingIds.includes(setting.id)}
              onChange={(event) =>
                change({ settingIds: event.target.checked ? [...draft.settingIds, setting.id] : draft.settingIds.filter((each) => each !== setting.id) })
              }
            />
          ))}
          <FieldMessage id="settings-error" error={fieldError(error, 'settingIds')} />
        </fieldset>
        <Field label={trialTexts.reference} hint={trialTexts.referenceHint} id={fieldIdOf('referenceSettingId')} error={fieldError(error, 'referenceSettingId')}>
          {(wiring) => (
            <Select
              {...wiring}
              emptyLabel=""
              value={draft.settingIds.includes(draft.referenceSettingId) ? draft.referenceSettingId : ''}
              options={draft.settingIds.map((id) => ({ value: id, label: nameOf(id) }))}
              onChange={(event) => change({ referenceSettingId: event.target.value })}
            />
          )}
        </Field>
        <Field label={trialTexts.mainFigure} hint={trialTexts.mainFigureHint} id={fieldIdOf('mainFigure')} error={fieldError(error, 'mainFigure')}>
          {(wiring) => (
            <Select
              {...wiring}
              value={draft.mainFigure}
              options={mainFigures.map((figure) => ({ value: figure, label: trialTexts.mainFigures[figure] }))}
              onChange={(event) => change({ mainFigure: mainFigures.find((each) => each === event.target.value) ?? draft.mainFigure })}
            />
          )}
        </Field>
        <RadioGroup
          legend={trialTexts.rule}
          name="comparison-rule"
          value={draft.comparisonRule}
          options={comparisonRules.map((rule) => ({ value: rule, label: trialTexts.rules[rule] }))}
          onChange={(event) => change({ comparisonRule: comparisonRules.find((each) => each === event.target.value) ?? draft.comparisonRule })}
        />
        <Field label={trialTexts.blocks} hint={trialTexts.blocksHint} id={fieldIdOf('blocks')} error={fieldError(error, 'blocks')}>
          {(wiring) => (
            <Select
              {...wiring}
              value={String(draft.blocks)}
              options={Array.from({ length: blocksMost }, (_, index) => ({ value: String(index + 1), label: String(index + 1) }))}
              onChange={(event) => change({ blocks: Number(event.target.value) })}
            />
          )}
        </Field>
      </div>
      {drawn ? (
        <div className="flex flex-col gap-3">
          <div className="flex flex-wrap items-center gap-x-4">
            <p className="font-mono text-15">{trialTexts.seed(String(draft.randomSeed))}</p>
            <Button look="secondary" onClick={() => change({ randomSeed: freshSeed() })}>
              {trialTexts.drawAgain}
            </Button>
          </div>
          <StripMap
            strips={drawn.blocks.flatMap((block) =>
              block.strips.map((strip) => ({
                id: String(strip.stripNumber),
                blockNumber: block.blockNumber,
                number: strip.stripNumber,
                setting: nameOf(strip.setting),
                instead: null,
                isReference: strip.setting === draft.referenceSettingId,
              })),
            )}
          />
          <Reach p={drawn.smallestAttainableP} />
          <Notice>{trialTexts.caution}</Notice>
        </div>
      ) : null}
      <FormButtons label={trialTexts.save} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}

/** What the layout can and cannot show, said before anybody walks to the planter. */
export function Reach({ p }: { p: number }) {
  return (
    <p className="max-w-reading">
      {trialTexts.reach(oneInText(p))} {p > 0.05 ? <span className="font-bold text-flag-text">{trialTexts.reachWeak}</span> : null}
    </p>
  );
}
