import type { ReactNode } from 'react';
import { PageHead } from '@/components/shell/page-head';
import { fieldIdOf } from '@/components/form/problem-summary';
import { LinkButton } from '@/components/ui/link-button';
import { dateText } from '@/lib/format/date-text';
import { intervalText } from '@/lib/format/interval-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { unitName } from '@/lib/format/unit-name';
import type { ReplantBasis, ReplantFigure, ReplantGap } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantSheetTexts } from '@/lib/texts/replant-sheet-texts';
import { replantTexts } from '@/lib/texts/replant-texts';
import { figurePath } from './figure-path';
import { FindingSentences } from './finding-sentences';

type FindingProps = {
  basis: ReplantBasis;
  units: UnitSystem;
  countHref: string;
  today: string;
  /** Below a signed decision, which is what such a page opens with. */
  second?: boolean;
};

/** What the page opens with: the answer in a sentence, or what is still needed for one. */
export function Finding({ second = false, ...props }: FindingProps) {
  const { title, sub, actions } = findingParts(props);
  if (!second) return <PageHead title={title} sub={sub} {...(actions ? { actions } : {})} />;
  return (
    <div className="flex max-w-reading flex-col gap-3 pb-4">
      <h3 className="text-21">{title}</h3>
      {sub}
      {actions}
    </div>
  );
}

function findingParts({ basis, units, countHref, today }: Omit<FindingProps, 'second'>): {
  title: string;
  sub: ReactNode;
  actions?: ReactNode;
} {
  if (basis.sentences) {
    const sentences = basis.sentences[units];
    return {
      title: sentences.first,
      sub: <FindingSentences sentences={sentences} passed={passedSentence(basis, today)} />,
    };
  }
  const gaps = basis.answer.kind === 'insufficient' ? basis.answer.gaps : [];
  const isOtherCrop = gaps.some(({ reason }) => reason === 'crop-without-table');
  const wantsCounts = gaps.some(({ reason }) =>
    ['no-row-samples', 'zone-not-counted', 'rest-not-counted'].includes(reason),
  );
  return {
    title: isOtherCrop ? replantTexts.noAnswerForCrop : replantTexts.noAnswer,
    sub: (
      <div className="flex flex-col gap-3">
        {gaps.map((gap) => (
          <Gap key={gap.reason} gap={gap} units={units} basis={basis} />
        ))}
        {basis.stand ? <p>{standSentence(basis.stand, units)}</p> : null}
      </div>
    ),
    ...(wantsCounts ? { actions: <LinkButton href={countHref}>{replantTexts.toCounts}</LinkButton> } : {}),
  };
}

function Gap({ gap, units, basis }: { gap: ReplantGap; units: UnitSystem; basis: ReplantBasis }) {
  if (gap.reason !== 'figures-missing') return <p>{replantTexts.gaps[gap.reason](gap.names)}</p>;
  const figures = gap.names as ReplantFigure[];
  const typedIn = basis.sheet?.inputs.typedIn ?? units;
  return (
    <p>
      {replantTexts.type}
      {figures.map((figure, index) => (
        <span key={figure}>
          {index === 0 ? ' ' : index === figures.length - 1 ? replantTexts.and : ', '}
          <a href={`#${fieldIdOf(figurePath(figure, typedIn))}`}>{replantTexts.figureNames[figure]}</a>
        </span>
      ))}
      {replantTexts.andPageAnswers}
    </p>
  );
}

function standSentence(stand: NonNullable<ReplantBasis['stand']>, units: UnitSystem): string {
  const plants = (plantsPerAcre: number) =>
    plantsPerAreaText(plantsPerAcre, units, { nearest: 100, withUnit: false });
  const { interval } = stand;
  const range = interval
    ? replantTexts.standInterval(intervalText(interval.lower, interval.upper, plants))
    : replantTexts.standWithoutInterval;
  return `${replantTexts.stand}: ${plants(stand.plantsPerAcre)} ${unitName('plants-per-area', units)}. ${range}`;
}

/** The sum goes on for a day that is over; nobody can act on it any more. */
function passedSentence(basis: ReplantBasis, today: string): string | null {
  const day = basis.sheet?.inputs.replantOn;
  return day && day < today ? replantSheetTexts.replantOnPassed(dateText(day)) : null;
}
