/** One place on the tape: a plant that stands there, or a seed that never came. */
export type TapePlant = {
  positionInches: number;
  /** Which piece of a tape that was laid anew after a cut; one piece where not given. */
  segment?: number;
  /** From 0, the last to come up, to 1, the first; null where nobody saw when. */
  earliness: number | null;
  late: boolean;
  double: boolean;
  kind: 'plant' | 'missing';
};

export type TapeEnd = 'mark' | 'plant';
