import Link from 'next/link';
import { plantingLine, type PlantingLineFacts } from '@/components/planting/planting-line';
import { dateText } from '@/lib/format/date-text';
import { paths } from '@/lib/paths/paths';
import type { Role } from '@/lib/schemas/vocabulary';
import { startTexts } from '@/lib/texts/start-texts';
import { awaitsDecision, type StartPlanting } from './start-headline';

export type ListedPlanting = PlantingLineFacts &
  StartPlanting & {
    plantingId: string;
    fieldName: string;
    farmName: string;
    rowSamples: number;
    rowSamplesVisited: number;
    lastVisitOn: string | null;
    trial: { locked: boolean } | null;
  };

type PlantingListProps = { org: string; role: Role; plantings: readonly ListedPlanting[] };

/** Plantings with how far each has come and the ways into it that this role has. */
export function PlantingList({ org, role, plantings }: PlantingListProps) {
  return (
    <ul className="flex flex-col">
      {plantings.map((planting) => (
        <li key={planting.plantingId} className="flex flex-col gap-1 border-b border-rule py-4 first:border-t">
          <h3 className="text-21">
            {planting.farmName}, {planting.fieldName}
          </h3>
          <p className="text-15 text-ink-soft">{plantingLine(planting)}</p>
          <p>
            {progressText(planting)}
            {role !== 'scout' && awaitsDecision(planting) ? (
              <span className="font-bold text-flag-text">{`. ${startTexts.awaits}`}</span>
            ) : null}
            {planting.decided ? `. ${startTexts.signed[planting.decided.choice]}` : ''}
            {planting.trial && !planting.trial.locked ? `. ${startTexts.layOut}` : ''}
          </p>
          <ul className="flex flex-wrap gap-x-6">
            {waysInto(org, role, planting).map((way) => (
              <li key={way.href}>
                <Link className="flex min-h-press items-center font-bold" href={way.href}>
                  {way.label}
                </Link>
              </li>
            ))}
          </ul>
        </li>
      ))}
    </ul>
  );
}

function progressText({ rowSamples, rowSamplesVisited, lastVisitOn }: ListedPlanting): string {
  if (rowSamples === 0) return startTexts.noRowSamples;
  const visited = lastVisitOn === null ? startTexts.neverVisited : startTexts.lastVisit(dateText(lastVisitOn));
  return `${startTexts.counted(String(rowSamplesVisited), String(rowSamples))}, ${visited}`;
}

function waysInto(org: string, role: Role, { plantingId, trial }: ListedPlanting): { label: string; href: string }[] {
  const { plan, count, scores, compare, decide } = startTexts.open;
  const comparing = trial ? [{ label: compare, href: paths.compare(org, plantingId) }] : [];
  if (role === 'grower') {
    return [
      { label: decide, href: paths.decide(org, plantingId) },
      { label: scores, href: paths.scores(org, plantingId) },
      ...comparing,
    ];
  }
  return [
    { label: plan, href: paths.plan(org, plantingId) },
    { label: count, href: paths.count(org, plantingId) },
    { label: scores, href: paths.scores(org, plantingId) },
    ...comparing,
    { label: decide, href: paths.decide(org, plantingId) },
  ];
}
