import Link from 'next/link';
import { interfaceTexts } from '@/lib/texts/interface-texts';

export type SeasonStep = {
  /** Plan, Count, Scores, Compare, Decide: only steps that have a screen. */
  label: string;
  href: string;
  /** Its date, or its days after planting. */
  when: string;
  current: boolean;
};

/** The season is the way through a planting; the step one is in is underlined. */
export function SeasonSteps({ steps }: { steps: readonly SeasonStep[] }) {
  return (
    <nav aria-label={interfaceTexts.shell.seasonNavigation} data-print="leave-out">
      <ol className="flex flex-wrap gap-x-6">
        {steps.map((step) => (
          <li key={step.href}>
            <Link
              href={step.href}
              aria-current={step.current ? 'step' : undefined}
              className="flex min-h-press flex-col justify-center border-b-4 border-transparent pt-2 pb-1 text-15 text-ink hover:border-rule aria-[current=step]:border-ink aria-[current=step]:font-bold"
            >
              {step.label}
              <span className="font-mono text-13 font-normal text-ink-soft">{step.when}</span>
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}
