import type { Outcome } from '@/lib/agronomy/outcome';

/** The value as text, or in words what was needed and what there is: "not enough yet: needs 2 spacings, has 1". */
export function outcomeText<T>(outcome: Outcome<T>, valueText: (value: T) => string): string {
  return outcome.kind === 'value'
    ? valueText(outcome.value)
    : `not enough yet: needs ${outcome.needed}, has ${outcome.had}`;
}
