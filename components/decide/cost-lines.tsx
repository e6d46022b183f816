'use client';

import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { FieldMessage } from '@/components/ui/field-message';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import type { ProblemError } from '@/lib/client/problem-error';
import { costLinesMost } from '@/lib/schemas/replant-sheet';
import { replantSheetTexts } from '@/lib/texts/replant-sheet-texts';
import { costAmountPath } from './figure-path';
import { sentCosts, type ReplantDraft } from './replant-draft';

type CostLinesProps = {
  draft: ReplantDraft;
  onChange: (costs: ReplantDraft['costs']) => void;
  error: ProblemError | null;
};

/** The costs of replanting, each under the grower's own name for it. */
export function CostLines({ draft, onChange, error }: CostLinesProps) {
  const texts = replantSheetTexts;
  const { costs, typedIn } = draft;
  const sent = sentCosts(draft);
  const change = (at: number, part: Partial<ReplantDraft['costs'][number]>) =>
    onChange(costs.map((cost, index) => (index === at ? { ...cost, ...part } : cost)));
  return (
    <fieldset className="flex min-w-0 flex-col gap-2">
      <legend className="text-15 font-bold">{texts.costs}</legend>
      <p className="text-13 text-ink-soft">{texts.costsHint}</p>
      {costs.map((cost, index) => {
        // An empty line is not sent, so the place in the refusal is the place among those sent.
        const place = sent.indexOf(cost);
        const namePath = `inputs.costs.${place}.label`;
        const amountPath = costAmountPath(place, typedIn);
        const nameError = place < 0 ? undefined : fieldError(error, namePath);
        const amountError = place < 0 ? undefined : fieldError(error, amountPath);
        return (
          <div
            key={index}
            className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-2 border-t border-rule pt-3 pb-1"
          >
            <div className="col-span-2">
              <TextInput
                id={place < 0 ? undefined : fieldIdOf(namePath)}
                aria-label={texts.costName(index + 1)}
                aria-invalid={nameError ? true : undefined}
                aria-describedby={nameError ? `cost-${index}-error` : undefined}
                value={cost.label}
                onChange={(event) => change(index, { label: event.target.value })}
              />
            </div>
            <label className="flex items-center gap-3 text-15">
              <span className="shrink-0">{texts.amountHead[typedIn]}</span>
              <NumberInput
                id={place < 0 ? undefined : fieldIdOf(amountPath)}
                aria-label={texts.costAmount[typedIn](index + 1)}
                aria-invalid={amountError ? true : undefined}
                aria-describedby={amountError ? `cost-${index}-error` : undefined}
                value={cost.amount}
                onChange={(event) => change(index, { amount: event.target.value })}
              />
            </label>
            <Button
              look="quiet"
              aria-label={texts.removeCostNamed(cost.label || texts.costName(index + 1))}
              onClick={() => onChange(costs.filter((_, each) => each !== index))}
            >
              {texts.removeCost}
            </Button>
            <div className="col-span-2">
              <FieldMessage id={`cost-${index}-error`} error={nameError ?? amountError} />
            </div>
          </div>
        );
      })}
      {costs.length < costLinesMost ? (
        <div>
          <Button look="secondary" onClick={() => onChange([...costs, { label: '', amount: '' }])}>
            {texts.addCost}
          </Button>
        </div>
      ) : null}
    </fieldset>
  );
}
