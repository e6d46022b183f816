import { describe, expect, it } from 'vitest';
import { splitTapeReadings } from '@/lib/schemas/tape-readings';
import type { TapeUnit } from '@/lib/schemas/vocabulary';

describe('a line of readings', () => {
  it.each<[string, TapeUnit, string[]]>([
    ['0 2 17 33 38 39 44 52 55 60 68', 'in', ['0', '2', '17', '33', '38', '39', '44', '52', '55', '60', '68']],
    ['  0   2\t\n17 33  ', 'in', ['0', '2', '17', '33']],
    ['5 3; 5 9', 'ft-in', ['5 3', '5 9']],
    ['5 1/2 7 9 3/4', 'in', ['5 1/2', '7', '9 3/4']],
    ['5,5 7,5', 'in', ['5,5', '7,5']],
    ['5, 7, 9', 'in', ['5', '7', '9']],
    ['5 ft 3; 5 ft 9', 'ft-in', ['5 ft 3', '5 ft 9']],
    ['5 ft 3 in 5 ft 9 1/2 6 ft', 'ft-in', ['5 ft 3 in', '5 ft 9 1/2', '6 ft']],
    ["5'3 5'9 1/2 6'", 'ft-in', ["5'3", "5'9 1/2", "6'"]],
    ['5.7 6.1', 'ft-tenths', ['5.7', '6.1']],
    ['', 'in', []],
    [' \n ', 'in', []],
  ])('takes "%s" apart on a tape of %s', (text, unit, readings) => {
    expect(splitTapeReadings(text, unit)).toEqual(readings);
  });
});
