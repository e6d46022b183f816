export type Chance = ReturnType<typeof chanceFrom>;

/** Chance that is the same again from the same seed. What phones make and send is drawn from it; only the timing is the machine's. */
export function chanceFrom(seed: number) {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const whole = (least: number, most: number) => least + Math.floor(next() * (most - least + 1));
  const pick = <Thing>(things: readonly Thing[]): Thing => {
    const picked = things[whole(0, things.length - 1)];
    if (picked === undefined) throw new Error('There is nothing to pick from.');
    return picked;
  };
  const shuffled = <Thing>(things: readonly Thing[]): Thing[] =>
    things.map((thing) => ({ thing, at: next() })).sort((a, b) => a.at - b.at).map(({ thing }) => thing);
  const hex = (digits: number) => Array.from({ length: digits }, () => whole(0, 15).toString(16)).join('');
  return {
    next,
    whole,
    pick,
    shuffled,
    happens: (share: number) => next() < share,
    /** An id in the form of a UUIDv7, as clients make them. */
    id: () => `0197${hex(4)}-${hex(4)}-7${hex(3)}-${pick(['8', '9', 'a', 'b'])}${hex(3)}-${hex(12)}`,
    /** A stream of its own, so that what one phone draws does not depend on how fast another is. */
    branch: () => chanceFrom(Math.floor(next() * 2 ** 32)),
  };
}
