'use client';

import { EmergenceCurves } from '@/components/charts/emergence-curves';
import { Figure } from '@/components/ui/figure';
import { Section } from '@/components/ui/section';
import type { FigureId } from '@/lib/agronomy/figures';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import { decimalText } from '@/lib/format/decimal-text';
import { unitName } from '@/lib/format/unit-name';
import { scoreTexts } from '@/lib/texts/score-texts';
import { FigureList } from './figure-list';
import { FigureOpener } from './figure-opener';
import type { FigureSubject } from './figure-subject';
import { PenaltyList } from './penalty-list';
import { ScoreParts } from './score-parts';
import { isOneRow, shownFigure, standText, withoutBound } from './shown-figure';

const first: readonly FigureId[] = ['plantsPerAcre', 'shareOfSeed', 'spreadDays', 'lateShare', 'score'];
const stand: readonly FigureId[] = ['plantsPerAcre', 'shareOfSeed', 'tapeLessCounted'];
const timing: readonly FigureId[] = ['daysTo10', 'daysTo50', 'daysTo90', 'spreadDays'];
const late: readonly FigureId[] = ['lateShare', 'lateShareFromCounts', 'latePattern'];
const spacing: readonly FigureId[] = [
  'spacingInchesMean',
  'spacingInchesSd',
  'spacingCv',
  'placement',
  'doublesAndGaps',
  'spacingInchesSdSingles',
  'spacingInchesSdFromMissing',
  'theoreticalSpacingInches',
];

/** Everything that is known of one planting, setting, strip or row sample: the five figures first, then all of them. */
export function ThingDetail({ subject, name }: { subject: FigureSubject; name: string }) {
  const { units } = useWho();
  const standing = subject.figures.plantsPerAcre;
  const plainStand = standing.kind === 'value' ? standText(standing.value.plantsPerAcre, isOneRow(subject), units) : undefined;
  return (
    <div className="flex flex-col gap-2">
      <div className="grid grid-cols-2 gap-x-6 gap-y-5 pb-8 lg:grid-cols-5">
        {first.map((id) => {
          const shown = shownFigure(id, subject, units);
          return (
            <Figure
              key={id}
              label={shown.label}
              value={
                <span className={shown.sort === null ? 'text-21' : 'text-27 lg:text-34'}>
                  {shown.bound ? <span className="text-15">{shown.bound} </span> : null}
                  <FigureOpener id={id} subject={subject} text={id === 'plantsPerAcre' ? plainStand : withoutBound(shown.text, shown.bound)} />
                </span>
              }
              detail={id === 'plantsPerAcre' && plainStand ? `${unitName('plants-per-area', units)}; ${shown.detail ?? ''}` : shown.detail}
            />
          );
        })}
      </div>
      <div className="grid gap-x-12 lg:grid-cols-2">
        <div className="min-w-0">
          <Section title={scoreTexts.sections.timing} lead={scoreTexts.spreadBesideStand}>
            <PlantingCurve subject={subject} name={name} />
            <FigureList ids={timing} subject={subject} />
            <PlantsLost subject={subject} />
          </Section>
          <Section title={scoreTexts.sections.late}>
            <FigureList ids={late} subject={subject} />
          </Section>
        </div>
        <div className="min-w-0">
          <Section title={scoreTexts.sections.score}>
            <ScoreParts subject={subject} />
          </Section>
          <Section title={scoreTexts.sections.stand}>
            <FigureList ids={stand} subject={subject} />
          </Section>
          <Section title={scoreTexts.sections.spacing} lead={scoreTexts.standardMeaning}>
            <FigureList ids={spacing} subject={subject} />
          </Section>
        </div>
      </div>
      <Section title={scoreTexts.sections.penalties} lead={scoreTexts.penaltiesLead}>
        <PenaltyList subject={subject} />
      </Section>
    </div>
  );
}

/** Plants come and go between visits; what was seen to go is a number of its own. */
function PlantsLost({ subject }: { subject: FigureSubject }) {
  const curve = subject.figures.emergenceCurve;
  if (curve.kind === 'insufficient' || curve.value.plantsLost === 0) return null;
  return <p className="text-13 text-ink-soft">{scoreTexts.plantsLost(decimalText(curve.value.plantsLost, 0))}</p>;
}

/** The curve as a share of the seed, which needs no area and is the same for one row and for all. */
function PlantingCurve({ subject, name }: { subject: FigureSubject; name: string }) {
  const { units } = useWho();
  const { emergenceCurve, shareOfSeed } = subject.figures;
  const isWhole = !subject.pooled || subject.pooled.rowSamplesCounted === subject.pooled.rowSamples;
  // Seeds of row samples that were never counted would press the curve down.
  if (!isWhole || emergenceCurve.kind === 'insufficient' || shareOfSeed.kind === 'insufficient') return null;
  if (emergenceCurve.value.points.length < 2) return null;
  const { points, rowSampleCount } = emergenceCurve.value;
  const { seeds } = shareOfSeed.value;
  return (
    <EmergenceCurves
      title={scoreTexts.curve.title(name)}
      sample={scoreTexts.curve.sample(countText(rowSampleCount, 'row sample'), countText(points.length, 'round of visits', 'rounds of visits'))}
      uncertainty={scoreTexts.curve.uncertainty}
      measure="share"
      units={units}
      fileName="emergence"
      series={[
        {
          id: 'all',
          label: name,
          seriesIndex: 0,
          points: points.map((point) => ({ daysAfterPlanting: point.days, value: point.plantsUp / seeds })),
        },
      ]}
    />
  );
}
