/**
 * Can every setting be compared with every other through blocks they share?
 *
 * Takes strips with block and setting. Returns whether one chain of shared blocks reaches all of them. Never
 * insufficient; throws nothing. Example: A and B in one block, C and D in the other: no.
 */
export function blockConnection(strips: readonly { block: string; setting: string }[]): boolean {
  const blocks = new Set(strips.map((strip) => strip.block));
  const reached = new Set([...blocks].slice(0, 1));
  for (let before = 0; before < reached.size;) {
    before = reached.size;
    const settings = new Set(
      strips.filter((strip) => reached.has(strip.block)).map((strip) => strip.setting),
    );
    for (const strip of strips) if (settings.has(strip.setting)) reached.add(strip.block);
  }
  return reached.size === blocks.size;
}
