import { register } from '@/lib/agronomy/register';
import { inferenceRegister } from '@/lib/agronomy/register-inference';
import { penaltyStudies } from '@/lib/agronomy/penalty/penalty';
import { comparisonEntries } from '@/lib/agronomy/register/comparison-entries';
import { decideEntries } from '@/lib/agronomy/register/decide-entries';
import { emergenceFitEntries } from '@/lib/agronomy/register/emergence-fit-entries';
import { moneyEntries } from '@/lib/agronomy/register/money-entries';
import type { RegisterEntry } from '@/lib/agronomy/register/register-entry';
import { residueEntries } from '@/lib/agronomy/register/residue-entries';
import { restatedPenaltyEntries } from '@/lib/agronomy/register/restated-penalty-entries';
import { scoreEntries } from '@/lib/agronomy/register/score-entries';
import { spacingEntries } from '@/lib/agronomy/register/spacing-entries';
import { standEntries } from '@/lib/agronomy/register/stand-entries';
import { standEstimatorEntries } from '@/lib/agronomy/register/stand-estimator-entries';
import { timingDetailEntries } from '@/lib/agronomy/register/timing-detail-entries';
import { timingEntries } from '@/lib/agronomy/register/timing-entries';
import { yieldEntries } from '@/lib/agronomy/register/yield-entries';
import { methodTexts } from '@/lib/texts/method-texts';
import { lateStudies, spacingStudies } from '@/lib/texts/score-texts';

export type MethodGroup = { id: string; title: string; entries: readonly RegisterEntry[] };

const replantIds = ['nafziger-1994', 'keep-or-replant', 'break-even-stand'];
const seedIds = ['where-the-seeds-went'];

/** Every entry of the whole register, each in one group and none left out. */
export function methodGroups(): MethodGroup[] {
  const texts = methodTexts.groups;
  const studies = [...lateStudies, ...spacingStudies];
  const ungrouped = penaltyStudies.filter((study) => !studies.includes(study));
  const ofSeeds = (entry: RegisterEntry) => seedIds.includes(entry.id);
  const ofReplant = (entry: RegisterEntry) => replantIds.includes(entry.id);
  const ofResidue = (entry: RegisterEntry) => residueEntries.includes(entry);
  return [
    { id: 'stand', title: texts.stand, entries: [...Object.values(standEntries), ...standEstimatorEntries.filter((entry) => !ofResidue(entry)), ...emergenceFitEntries.filter(ofSeeds)] },
    { id: 'timing', title: texts.timing, entries: [...Object.values(timingEntries), ...timingDetailEntries, ...emergenceFitEntries.filter((entry) => !ofSeeds(entry))] },
    { id: 'spacing', title: texts.spacing, entries: Object.values(spacingEntries) },
    { id: 'residue', title: texts.residue, entries: residueEntries },
    { id: 'score', title: texts.score, entries: Object.values(scoreEntries) },
    { id: 'late', title: texts.late, entries: [...lateStudies.map((study) => register[study]), ...restatedPenaltyEntries] },
    { id: 'uneven', title: texts.uneven, entries: [...spacingStudies, ...ungrouped].map((study) => register[study]) },
    { id: 'comparison', title: texts.comparison, entries: [...inferenceRegister.filter((entry) => !ofReplant(entry)), ...comparisonEntries] },
    { id: 'replant', title: texts.replant, entries: [...inferenceRegister.filter(ofReplant), ...decideEntries] },
    { id: 'yield', title: texts.yield, entries: yieldEntries },
    { id: 'money', title: texts.money, entries: moneyEntries },
  ];
}
