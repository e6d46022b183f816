import type { Outcome } from './outcome';
import type { Replant, ReplantOverInterval } from './replant';
import type { Span } from './replant-sum';
import { NAFZIGER_STAND_HIGHEST, NAFZIGER_STAND_LOWEST } from './replant-table-nafziger';
import type { TableEnd } from './replant-table-nafziger';

/** How the reader's units and rounding are written. Amounts handed over are never negative. */
export type ReplantWording = {
  /** Dollars per area with its unit, for example "$97 an acre". */
  dollarsPerAcre: (dollars: number) => string;
  /** For example "18,900 to 22,100 plants per acre". */
  standRange: (lower: number, upper: number) => string;
  /** For example "10,000 plants per acre". */
  stand: (plantsPerAcre: number) => string;
  /** For example "98 %". */
  share: (share: number) => string;
};

export type ReplantSentences = {
  /** The answer with its dollars, first. */
  first: string;
  /** How it holds over the count. */
  second: string;
  /** What the table's end leaves open; null when both figures lie within the table. */
  third: string | null;
};

/**
 * What does the keep-or-replant sum say in plain words?
 *
 * Takes the answer and how to write its numbers. Returns one sentence with the dollars, one with the uncertainty
 * and, where the table only bounds, one that says which way. Never insufficient; throws nothing of its own.
 * It claims no more than the recommendation: a call that is too close is called so, with what makes it close.
 * Example: "Keep this stand. Replanting would lose about $97 an acre."
 */
export function replantSentence(answer: Replant, wording: ReplantWording): ReplantSentences {
  return {
    first: firstSentence(answer, wording),
    second: secondSentence(answer.overInterval, wording),
    third: answer.isBounded ? thirdSentence(answer, wording) : null,
  };
}

function firstSentence(answer: Replant, wording: ReplantWording): string {
  const gain = answer.gainDollarsPerAcre;
  const exact = gain.lower === gain.upper;
  switch (answer.recommendation) {
    case 'keep':
      return `Keep this stand. Replanting would lose ${exact ? 'about' : 'at least'} ${wording.dollarsPerAcre(-gain.upper)}.`;
    case 'replant':
      return `Replant. It would gain ${exact ? 'about' : 'at least'} ${wording.dollarsPerAcre(gain.lower)} over keeping this stand.`;
    case 'too-close':
      return `Too close to call. Replanting would ${changeInWords(gain, wording)}${
        answer.because === 'within-table-rounding'
          ? ', less than the rounding of the yield table is worth.'
          : ', but the count could be off by enough to turn that.'
      }`;
    case 'cannot-tell':
      return `The yield table cannot settle this one. Replanting would ${changeInWords(gain, wording)}.`;
  }
}

function secondSentence(interval: Outcome<ReplantOverInterval>, wording: ReplantWording): string {
  if (interval.kind !== 'value') {
    return 'The count alone cannot say how far off it may be: that takes at least 2 row samples.';
  }
  const { standLower, standUpper, gainAtLowerDollarsPerAcre, gainAtUpperDollarsPerAcre, draws } =
    interval.value;
  const range = `The count puts the stand at ${wording.standRange(standLower, standUpper)} (95 % interval).`;
  const ends =
    `At its low end replanting would ${changeInWords(gainAtLowerDollarsPerAcre, wording)}, ` +
    `at its high end ${changeInWords(gainAtUpperDollarsPerAcre, wording)}`;
  const open = draws.openShare > 0 ? `, and ${wording.share(draws.openShare)} the table leaves open` : '';
  return `${range} ${ends}; keeping earns more in ${wording.share(draws.keepWinsShare)} of the counts this one could have been${open}.`;
}

function endInWords(end: TableEnd, wording: ReplantWording): string {
  switch (end) {
    case 'stand-below':
      return `its lowest stand is ${wording.stand(NAFZIGER_STAND_LOWEST)}`;
    case 'stand-above':
      return `its highest stand is ${wording.stand(NAFZIGER_STAND_HIGHEST)}`;
    case 'date-before':
      return 'it begins with 10 April';
    case 'date-after':
      return 'it ends with 9 June';
  }
}

function thirdSentence(answer: Replant, wording: ReplantWording): string {
  const parts = [
    { name: 'keeping', reading: answer.sum.keepReading },
    { name: 'replanting', reading: answer.sum.replantReading },
  ].flatMap(({ name, reading }) =>
    reading.kind === 'at-most'
      ? [`${reading.beyond.map((end) => endInWords(end, wording)).join(' and ')}, so ${name} makes at most what is shown`]
      : [],
  );
  const standing = answer.standsDespiteBound ? ' The answer stands all the same.' : '';
  return `The yield table ends before this case: ${parts.join('; ')}.${standing}`;
}

/** "lose about $97 an acre", "gain at least $12 an acre", "change earnings by between a loss of … and a gain of …". */
function changeInWords(gain: Span, wording: ReplantWording): string {
  if (gain.lower === gain.upper) {
    return gain.lower < 0
      ? `lose about ${wording.dollarsPerAcre(-gain.lower)}`
      : `gain about ${wording.dollarsPerAcre(gain.lower)}`;
  }
  if (gain.upper < 0) return `lose at least ${wording.dollarsPerAcre(-gain.upper)}`;
  if (gain.lower > 0) return `gain at least ${wording.dollarsPerAcre(gain.lower)}`;
  return `bring anything from a loss of ${wording.dollarsPerAcre(-gain.lower)} to a gain of ${wording.dollarsPerAcre(gain.upper)}`;
}
