/**
 * Which places lie on the same piece of a tape that was laid anew after a cut?
 *
 * Takes things in the order of the row and how to read the piece of each; not given is the first. Returns the runs of one
 * piece, in order, each thing once. Never insufficient, throws nothing. Method: a run ends where the piece changes.
 * It does not tell how far the pieces lie apart. Example: pieces 0 0 1 give two runs, of two and of one.
 */
export function bySegment<Thing>(things: readonly Thing[], segmentOf: (thing: Thing) => number | undefined): Thing[][] {
  const runs: Thing[][] = [];
  things.forEach((thing, index) => {
    const before = things[index - 1];
    const goesOn = before !== undefined && (segmentOf(before) ?? 0) === (segmentOf(thing) ?? 0);
    if (goesOn) runs.at(-1)?.push(thing);
    else runs.push([thing]);
  });
  return runs;
}
