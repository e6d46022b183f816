import { requiredNumber } from './required-number';

/**
 * How long a tape crosses a strip from edge to edge?
 *
 * Takes the width of the strip in feet (above 0) and the angle between tape and rows in degrees (above 0, at most 90;
 * 45 unless given). Returns feet. Never insufficient; throws ImpossibleInput outside those limits.
 * Method: width / sin(angle). A shorter tape is laid in several pieces, or the angle is made steeper.
 * It does not tell how many marks to read; 100 over at least 3 places is the extension services' rule.
 * Example: 45° over a 40-ft strip: 57 ft, seven more than a 50-ft tape.
 */
export function transectLengthFeet(stripWidthFeet: number, angleDegrees = 45): number {
  requiredNumber(stripWidthFeet, 'stripWidthFeet', { above: 0 });
  requiredNumber(angleDegrees, 'angleDegrees', { above: 0, atMost: 90 });
  return stripWidthFeet / Math.sin((angleDegrees * Math.PI) / 180);
}
