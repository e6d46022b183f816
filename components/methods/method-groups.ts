import { register } from '@/lib/agronomy/register';
import { inferenceRegister } from '@/lib/agronomy/register-inference';
import { penaltyStudies } from '@/lib/agronomy/penalty/penalty';
import type { RegisterEntry } from '@/lib/agronomy/register/register-entry';
import { scoreEntries } from '@/lib/agronomy/register/score-entries';
import { spacingEntries } from '@/lib/agronomy/register/spacing-entries';
import { standEntries } from '@/lib/agronomy/register/stand-entries';
import { timingEntries } from '@/lib/agronomy/register/timing-entries';
import { methodTexts } from '@/lib/texts/method-texts';
import { lateStudies, spacingStudies } from '@/lib/texts/score-texts';

export type MethodGroup = { id: string; title: string; entries: readonly RegisterEntry[] };

const replantIds = ['nafziger-1994', 'keep-or-replant', 'break-even-stand'];

/** Every entry of both registers, each in one group and none left out. */
export function methodGroups(): MethodGroup[] {
  const texts = methodTexts.groups;
  const studies = [...lateStudies, ...spacingStudies];
  const ungrouped = penaltyStudies.filter((study) => !studies.includes(study));
  return [
    { id: 'stand', title: texts.stand, entries: Object.values(standEntries) },
    { id: 'timing', title: texts.timing, entries: Object.values(timingEntries) },
    { id: 'spacing', title: texts.spacing, entries: Object.values(spacingEntries) },
    { id: 'score', title: texts.score, entries: Object.values(scoreEntries) },
    { id: 'late', title: texts.late, entries: lateStudies.map((study) => register[study]) },
    { id: 'uneven', title: texts.uneven, entries: [...spacingStudies, ...ungrouped].map((study) => register[study]) },
    { id: 'comparison', title: texts.comparison, entries: inferenceRegister.filter((entry) => !replantIds.includes(entry.id)) },
    { id: 'replant', title: texts.replant, entries: inferenceRegister.filter((entry) => replantIds.includes(entry.id)) },
  ];
}
