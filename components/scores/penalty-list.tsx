'use client';

import type { PenaltyStudy } from '@/lib/agronomy/penalty/penalty';
import { lateStudies, scoreTexts, spacingStudies } from '@/lib/texts/score-texts';
import { FigureList } from './figure-list';
import type { FigureSubject } from './figure-subject';

/** What each published response says this stand loses, side by side; those that cannot be read here stand last, with why. */
export function PenaltyList({ subject }: { subject: FigureSubject }) {
  return (
    <div className="grid gap-x-10 gap-y-6 md:grid-cols-2">
      {(
        [
          [scoreTexts.penaltiesLateGroup, lateStudies],
          [scoreTexts.penaltiesSpacingGroup, spacingStudies],
        ] as const
      ).map(([title, studies]) => (
        <div key={title} className="flex flex-col gap-2">
          <h3 className="text-15">{title}</h3>
          <FigureList ids={saidFirst(studies, subject)} subject={subject} />
        </div>
      ))}
    </div>
  );
}

function saidFirst(studies: readonly PenaltyStudy[], { penalties }: FigureSubject): PenaltyStudy[] {
  const isSaid = (study: PenaltyStudy) => penalties[study].kind === 'value';
  return [...studies.filter(isSaid), ...studies.filter((study) => !isSaid(study))];
}
