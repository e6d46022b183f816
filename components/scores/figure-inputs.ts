import type { FigureId, Figures } from '@/lib/agronomy/figures';
import { areaText } from '@/lib/format/area-text';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { daysText } from '@/lib/format/days-text';
import { decimalText } from '@/lib/format/decimal-text';
import { percentText } from '@/lib/format/percent-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { rowLengthText } from '@/lib/format/row-length-text';
import { spacingText } from '@/lib/format/spacing-text';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { figureInputTexts as texts } from '@/lib/texts/figure-input-texts';
import { spacingStudies } from '@/lib/texts/score-texts';
import type { FigureSubject } from './figure-subject';
import { isStudy, shownFigure } from './shown-figure';

export type InputFact = { name: string; text: string };

/** What a figure was made from, as it was read or typed: the first thing an opened number shows. */
export function figureInputs(id: FigureId, subject: FigureSubject, units: UnitSystem): InputFact[] {
  if (isStudy(id)) return spacingStudies.includes(id) ? spacingPenaltyInputs(id, subject, units) : latePenaltyInputs(subject, units);
  switch (id) {
    case 'plantsPerAcre':
    case 'plantsPerAcreInterval':
      return [...standInputs(subject, units), ...intervalInputs(subject, units)];
    case 'shareOfSeed':
    case 'shareOfSeedInterval':
      return [...seedInputs(subject), rate(subject, units), ...intervalInputs(subject, units)];
    case 'emergenceCurve':
    case 'daysTo10':
    case 'daysTo50':
    case 'daysTo90':
    case 'spreadDays':
      return timingInputs(subject);
    case 'lateShare':
      return [...lateInputs(subject.figures.lateShare), ...limitInputs(subject), ...timingInputs(subject)];
    case 'lateShareFromCounts':
      return [...lateInputs(subject.figures.lateShareFromCounts), ...limitInputs(subject), ...timingInputs(subject)];
    case 'latePattern':
      return lateInputs(subject.figures.lateShare);
    case 'tapeLessCounted':
      return [...groupInputs(subject), ...placesInputs(subject)];
    case 'score':
      return scoreInputs(subject);
    case 'scoreStand':
      return [
        shown('plantsPerAcre', subject, units),
        { name: texts.intended, text: plantsPerAreaText(subject.planting.intendedPlantsPerAcre, units) },
      ];
    case 'scoreTiming':
      return [shown('spreadDays', subject, units)];
    case 'scoreSpacing':
      return [shown('spacingInchesSd', subject, units)];
    case 'theoreticalSpacingInches':
      return [rate(subject, units), rowSpacing(subject, units)];
    case 'spacingInchesSdFromMissing':
      return [shown('theoreticalSpacingInches', subject, units), shown('shareOfSeed', subject, units)];
    case 'placement':
    case 'spacingInchesSdSingles':
      return [...spacingInputs(subject), ...placementInputs(subject), shown('theoreticalSpacingInches', subject, units)];
    default:
      return spacingInputs(subject);
  }
}

function shown(id: FigureId, subject: FigureSubject, units: UnitSystem): InputFact {
  const { label, text } = shownFigure(id, subject, units);
  return { name: label, text };
}

const rate = ({ planting }: FigureSubject, units: UnitSystem) => ({
  name: texts.seedingRate,
  text: plantsPerAreaText(planting.seedsPerAcre, units, { withUnit: false }),
});

const rowSpacing = ({ planting }: FigureSubject, units: UnitSystem) => ({
  name: texts.rowSpacing,
  text: spacingText(planting.rowSpacingInches, units),
});

function groupInputs({ pooled }: FigureSubject): InputFact[] {
  if (!pooled) return [];
  return [
    { name: texts.rowSamples, text: texts.ofWhich(pooled.rowSamplesCounted, pooled.rowSamples) },
    ...(pooled.strips > 0 ? [{ name: texts.strips, text: decimalText(pooled.strips, 0) }] : []),
  ];
}

function standInputs(subject: FigureSubject, units: UnitSystem): InputFact[] {
  const { row, figures } = subject;
  const held =
    figures.plantsPerAcre.kind === 'value'
      ? [
          { name: texts.plantsHeld, text: decimalText(figures.plantsPerAcre.value.plantsHeld, 1) },
          { name: texts.area, text: areaText(figures.plantsPerAcre.value.areaAcres, units, { decimals: 5 }) },
        ]
      : [];
  if (!row) return [...groupInputs(subject), ...held];
  const last = row.counts.at(-1);
  return [
    ...(last
      ? [
          { name: texts.lastCount(dateText(last.visitedOn)), text: countText(last.plantsUp, 'plant') },
          { name: texts.doubtful, text: decimalText(last.doubtful, 0) },
        ]
      : placesInputs(subject)),
    { name: texts.length, text: texts.asTyped(row.length.typed, row.length.unit, rowLengthText(row.length.inches, units)) },
    { name: texts.ends, text: texts.endsAre(row.startEnd, row.farEnd) },
    rowSpacing(subject, units),
    ...held,
  ];
}

function intervalInputs({ figures }: FigureSubject, units: UnitSystem): InputFact[] {
  const interval = figures.plantsPerAcreInterval;
  if (interval.kind === 'insufficient') return [];
  const { method, student, units: places } = interval.value;
  return [
    { name: texts.method, text: texts.methods[method] },
    { name: texts.places, text: decimalText(places, 0) },
    ...(student
      ? [
          { name: texts.standardError, text: plantsPerAreaText(student.standardErrorPlantsPerAcre, units, { withUnit: false }) },
          { name: texts.degreesOfFreedom, text: decimalText(student.degreesOfFreedom, Number.isInteger(student.degreesOfFreedom) ? 0 : 1) },
        ]
      : []),
  ];
}

function seedInputs({ figures }: FigureSubject): InputFact[] {
  if (figures.shareOfSeed.kind === 'insufficient') return [];
  const { plantsHeld, seeds } = figures.shareOfSeed.value;
  return [
    { name: texts.plantsHeld, text: decimalText(plantsHeld, 1) },
    { name: texts.seeds, text: decimalText(seeds, 1) },
  ];
}

function timingInputs(subject: FigureSubject): InputFact[] {
  const { row, figures, pooled, planting } = subject;
  const planted = { name: texts.planted, text: `${dateText(planting.plantedOn)}${planting.plantedAt ? `, ${planting.plantedAt}` : ''}` };
  if (row) {
    return [
      planted,
      ...row.counts.map((count) => ({
        name: texts.visit(dateText(count.visitedOn, 'day-and-month'), count.visitedAt, daysText(count.days, { withUnit: false })),
        text: texts.up(countText(count.plantsUp, 'plant'), count.doubtful),
      })),
    ];
  }
  const curve = figures.emergenceCurve;
  return [
    planted,
    ...(pooled && pooled.strips > 1 ? [{ name: texts.stripsTimed, text: decimalText(pooled.stripsTimed, 0) }] : []),
    ...(curve.kind === 'value'
      ? curve.value.points.map((point) => ({
          name: texts.day(daysText(point.days, { withUnit: false })),
          text: texts.plantsUp(decimalText(point.plantsUp, Number.isInteger(point.plantsUp) ? 0 : 1)),
        }))
      : []),
  ];
}

function lateInputs(late: Figures['lateShare']): InputFact[] {
  if (late.kind === 'insufficient') return [];
  const { latePlants, plants, plantsUnknown, lateDelayDaysMean, source, slowShare, veryLateShare } = late.value;
  const plain = (of: number) => decimalText(of, Number.isInteger(of) ? 0 : 1);
  return [
    { name: texts.lateFrom, text: texts.lateSources[source] },
    { name: texts.latePlants, text: texts.ofPlants(plain(latePlants), plain(plants)) },
    ...(lateDelayDaysMean.kind === 'value' ? [{ name: texts.meanDelay, text: daysText(lateDelayDaysMean.value) }] : []),
    { name: texts.veryLate, text: percentText(veryLateShare, { decimals: 1 }) },
    { name: texts.slow, text: percentText(slowShare, { decimals: 1 }) },
    ...(plantsUnknown > 0 ? [{ name: texts.unknown, text: decimalText(plantsUnknown, 0) }] : []),
  ];
}

function limitInputs({ planting: { lateLimits } }: FigureSubject): InputFact[] {
  return [{ name: texts.limits, text: texts.limitsAre(lateLimits.slowDays, lateLimits.lateDays, lateLimits.veryLateDays) }];
}

function placesInputs({ row, pooled }: FigureSubject): InputFact[] {
  if (pooled) return [{ name: texts.tapeSheets, text: decimalText(pooled.rowSamplesWithTape, 0) }];
  if (!row?.tapeSheet) return [];
  const places = row.tapeSheet.places.map(({ typed, kind }) => (kind === 'plant' ? typed : `${typed} ${texts.kinds[kind]}`));
  return [{ name: texts.tapeSheet(dateText(row.tapeSheet.readOn), texts.tapeUnits[row.tapeSheet.tapeUnit]), text: places.join(', ') }];
}

function spacingInputs(subject: FigureSubject): InputFact[] {
  const { doublesAndGaps } = subject.figures;
  return [
    ...placesInputs(subject),
    ...(doublesAndGaps.kind === 'value' ? [{ name: texts.spacings, text: decimalText(doublesAndGaps.value.spacings, 0) }] : []),
  ];
}

function placementInputs({ figures: { placement } }: FigureSubject): InputFact[] {
  if (placement.kind === 'insufficient') return [];
  const [multiples, singles, one, two, three] = placement.value.regions;
  return [
    { name: texts.regions, text: texts.regionsAre(multiples, singles, one + two + three) },
    ...(placement.value.precision.kind === 'value'
      ? [{ name: texts.precision, text: percentText(placement.value.precision.value, { decimals: 1 }) }]
      : []),
  ];
}

function scoreInputs({ figures }: FigureSubject): InputFact[] {
  const weights = figures.score.kind === 'value' ? figures.score.value.weights : null;
  const parts = { stand: figures.scoreStand, timing: figures.scoreTiming, spacing: figures.scoreSpacing };
  const facts = (['stand', 'timing', 'spacing'] as const).map((name) => {
    const part = parts[name];
    return {
      name: texts.parts[name],
      text:
        part.kind === 'value' && weights
          ? texts.partWeighs(decimalText(part.value.points, 0), percentText(weights[name]))
          : texts.partLeftOut,
    };
  });
  return figures.score.kind === 'value' ? [...facts, { name: texts.version, text: figures.score.value.version }] : facts;
}

function latePenaltyInputs(subject: FigureSubject, units: UnitSystem): InputFact[] {
  return [...lateInputs(subject.figures.lateShare), shown('latePattern', subject, units)];
}

function spacingPenaltyInputs(id: FigureId, subject: FigureSubject, units: UnitSystem): InputFact[] {
  return [shown(id === 'novak-ransom-2018-skips' ? 'placement' : 'spacingInchesSd', subject, units), ...spacingInputs(subject)];
}
