import { AppError, type Question } from '@/lib/errors/app-error';
import type { Confirmation } from '@/lib/schemas/operation';

/**
 * Stops an entry that breaks a rule one may break with reason, unless each question was asked and answered: the
 * confirmation names the rule and what it is about, so that "asked" can be told from "swallowed".
 */
export function askAbout(questions: readonly Question[], confirmations: readonly Confirmation[]): void {
  const open = questions.filter(
    (question) => !confirmations.some((given) => given.rule === question.rule && given.about === question.about),
  );
  if (open.length > 0) throw new AppError('needs-confirmation', { questions: open });
}
