import type { Outcome } from '@/lib/agronomy/outcome';

/** The value of an outcome; a test that meets insufficient here says what was missing. */
export function answerOf<T>(outcome: Outcome<T>): T {
  if (outcome.kind === 'insufficient') {
    throw new Error(`insufficient: ${outcome.reason}, needed ${outcome.needed}, had ${outcome.had}`);
  }
  return outcome.value;
}

/** The reason of an insufficient outcome; a value here is a failure. */
export function reasonOf(outcome: Outcome<unknown>): string {
  return outcome.kind === 'insufficient' ? outcome.reason : 'a value';
}
