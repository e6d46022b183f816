'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { SeasonSteps, type SeasonStep } from '@/components/shell/season-steps';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import { daysText } from '@/lib/format/days-text';
import { paths } from '@/lib/paths/paths';
import type { DecisionChoice } from '@/lib/schemas/vocabulary';
import { navigationTexts } from '@/lib/texts/navigation-texts';
import { plantingTexts } from '@/lib/texts/planting-texts';
import { plantingLine, type PlantingLineFacts } from './planting-line';

type PlantingSeasonProps = {
  org: string;
  season: {
    head: PlantingLineFacts & { plantingId: string; fieldId: string; fieldName: string; farmId: string; farmName: string };
    trial: { locked: boolean; settings: number } | null;
    firstVisitOn: string | null;
    lastVisitOn: string | null;
    decided: DecisionChoice | null;
    may: { count: boolean; scores: boolean; compare: boolean; decide: boolean };
  };
};

/** Above every page of a planting: the way back, what it is, and the season as the way through it. */
export function PlantingSeason({ org, season }: PlantingSeasonProps) {
  const here = usePathname();
  const { head } = season;
  const steps = seasonSteps(org, season).map((step) => ({ ...step, current: here.startsWith(step.href) }));
  return (
    <div className="-mt-4 mb-6 flex flex-col gap-1 border-b border-rule">
      <p className="text-13">
        <Link href={paths.farm(org, head.farmId)}>{head.farmName}</Link>
        {', '}
        <Link href={paths.field(org, head.fieldId)}>{head.fieldName}</Link>
        <span className="text-ink-soft">{`. ${plantingLine(head)}`}</span>
      </p>
      <SeasonSteps steps={steps} />
    </div>
  );
}

function seasonSteps(org: string, season: PlantingSeasonProps['season']): Omit<SeasonStep, 'current'>[] {
  const { head, trial, firstVisitOn, lastVisitOn, decided, may } = season;
  const texts = plantingTexts.season;
  const day = (on: string) => daysText(daysAfter(head.plantedOn, on), { withUnit: false, decimals: 0 });
  const counted =
    firstVisitOn === null || lastVisitOn === null
      ? texts.notYet
      : firstVisitOn === lastVisitOn
        ? texts.day(day(lastVisitOn))
        : texts.days(day(firstVisitOn), day(lastVisitOn));
  const planned = trial === null ? dateText(head.plantedOn, 'day-and-month') : trial.locked ? texts.locked : texts.notLocked;
  return [
    { label: navigationTexts.plan, href: paths.plan(org, head.plantingId), when: planned },
    ...(may.count ? [{ label: navigationTexts.count, href: paths.count(org, head.plantingId), when: counted }] : []),
    ...(may.scores
      ? [{ label: navigationTexts.scores, href: paths.scores(org, head.plantingId), when: lastVisitOn === null ? texts.notYet : texts.day(day(lastVisitOn)) }]
      : []),
    ...(may.compare && trial
      ? [{ label: navigationTexts.compare, href: paths.compare(org, head.plantingId), when: texts.settings(countText(trial.settings, 'setting')) }]
      : []),
    ...(may.decide
      ? [{ label: navigationTexts.decide, href: paths.decide(org, head.plantingId), when: decided === null ? texts.unsigned : texts[decided] }]
      : []),
  ];
}
