import { errorCatalogue, type ErrorCode } from './error-catalogue';

/** One field that cannot be used: its path in the body and a sentence that says what to do. */
export type FieldProblem = { path: string; message: string };

/** One question that must be answered before an entry is taken: a rule that was broken, and about what. */
export type Question = { rule: string; about: string; sentence: string };

/** The one error that services throw. Carries a code of the catalogue, and where useful fields, questions, or what stands. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly fields: FieldProblem[];
  readonly questions: Question[];
  readonly standingVersion: number | undefined;
  /** What stands in the place of an edit that lost, written out for its sender to settle which holds. */
  readonly standing: Record<string, unknown> | undefined;

  constructor(
    code: ErrorCode,
    more: { sentence?: string; fields?: FieldProblem[]; questions?: Question[]; standingVersion?: number; standing?: Record<string, unknown> | undefined } = {},
  ) {
    super(more.sentence ?? errorCatalogue[code].sentence);
    this.name = 'AppError';
    this.code = code;
    this.fields = more.fields ?? [];
    this.questions = more.questions ?? [];
    this.standingVersion = more.standingVersion;
    this.standing = more.standing;
  }
}

/** Refuses one field with a sentence; the commonest refusal of a service. */
export function badField(path: string, message: string): AppError {
  return new AppError('bad-input', { fields: [{ path, message }] });
}
