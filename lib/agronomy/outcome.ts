/**
 * The three answers a calculation can give: a value, *insufficient* with how much was needed and had,
 * or a throw for what cannot be. None of them is ever 0, null or NaN standing in for another.
 */

/** The question could be answered. */
export type Value<T> = { kind: 'value'; value: T };

/** The inputs are sound but too few; `reason` is a kebab-case code, `needed` and `had` are plain words. */
export type Insufficient = { kind: 'insufficient'; reason: string; needed: string; had: string };

export type Outcome<T> = Value<T> | Insufficient;

/** Wraps an answer, for example `value(30748)`. */
export function value<T>(answer: T): Value<T> {
  return { kind: 'value', value: answer };
}

/** Says what was missing, for example `insufficient('too-few-spacings', '2 spacings', '1 spacing')`. */
export function insufficient(reason: string, needed: string, had: string): Insufficient {
  return { kind: 'insufficient', reason, needed, had };
}

/** Applies a calculation to an answer and passes *insufficient* on untouched. */
export function mapOutcome<T, U>(outcome: Outcome<T>, transform: (answer: T) => U): Outcome<U> {
  return outcome.kind === 'value' ? value(transform(outcome.value)) : outcome;
}

/** Applies a calculation that may itself be insufficient. */
export function chainOutcome<T, U>(outcome: Outcome<T>, next: (answer: T) => Outcome<U>): Outcome<U> {
  return outcome.kind === 'value' ? next(outcome.value) : outcome;
}

/** Thrown when an input cannot be: not a finite number, negative where only zero and up exists, out of order. */
export class ImpossibleInput extends Error {
  readonly field: string | undefined;

  constructor(message: string, field?: string) {
    super(message);
    this.name = 'ImpossibleInput';
    this.field = field;
  }
}
