import { ImpossibleInput } from './outcome';
import { requiredCount } from './required-count';

/** One tape laid out: marks read, and how many of them lay over residue. */
export type ResidueMarks = { marksRead: number; marksCovered: number };

/**
 * How much of one tape lies over residue?
 *
 * Takes the marks read (whole, 1 or more) and those over residue (whole, not more than were read). Returns percent
 * cover. Never insufficient; throws ImpossibleInput otherwise.
 * Method: marks over residue / marks read, the line transect of the extension services (Missouri G1570). Look straight
 * down at the same edge of every mark; a piece counts if it would stop a raindrop, 3/32 in (NRCS) or 1/8 in (Kansas).
 * One tape says nothing about the rest of the field. Example: 44 of 100 marks are 44 %.
 */
export function residueMarksPercent({ marksRead, marksCovered }: ResidueMarks): number {
  requiredCount(marksRead, 'marksRead', { atLeast: 1 });
  requiredCount(marksCovered, 'marksCovered', { atLeast: 0, atMost: marksRead });
  return (100 * marksCovered) / marksRead;
}

/**
 * How many marks of a tape were over residue, when those over residue were written down?
 *
 * Takes the marks read (whole, 1 or more) and the numbers of those over residue, from 1, in any order. Returns the count
 * as ResidueMarks. Never insufficient; throws ImpossibleInput for a mark named twice or not on the tape.
 * Method: counting. Example: marks 1, 3, 8 and 9 of 10: 4 of 10, 40 % (Missouri G1570).
 */
export function residueMarks(marksRead: number, marksOverResidue: readonly number[]): ResidueMarks {
  requiredCount(marksRead, 'marksRead', { atLeast: 1 });
  for (const mark of marksOverResidue) {
    requiredCount(mark, 'marksOverResidue', { atLeast: 1, atMost: marksRead });
  }
  if (new Set(marksOverResidue).size < marksOverResidue.length) {
    throw new ImpossibleInput('A mark is named twice.', 'marksOverResidue');
  }
  return { marksRead, marksCovered: marksOverResidue.length };
}
