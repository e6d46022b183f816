export type LabelWish = { center: number; width: number };

/**
 * Finds places for labels of different widths beside each other, the first wish first: each goes where it wants,
 * else beside what is in its way but no farther than `reach`, else it is left out (null). Two placed labels are
 * always at least `clearance` apart.
 */
export function placeLabels(
  wishes: readonly LabelWish[],
  from: number,
  to: number,
  clearance: number,
  reach: number,
): (number | null)[] {
  const placed: LabelWish[] = [];
  return wishes.map(({ center, width }) => {
    const isFree = (at: number) =>
      at - width / 2 >= from - 1e-9 &&
      at + width / 2 <= to + 1e-9 &&
      placed.every((other) => Math.abs(other.center - at) >= (other.width + width) / 2 + clearance - 1e-9);
    const inside = Math.min(to - width / 2, Math.max(from + width / 2, center));
    const candidates = [
      inside,
      ...placed.flatMap((other) => {
        const away = (other.width + width) / 2 + clearance;
        return [other.center - away, other.center + away];
      }),
    ]
      .filter((at) => Math.abs(at - center) <= Math.max(reach, Math.abs(inside - center)))
      .sort((a, b) => Math.abs(a - center) - Math.abs(b - center));
    const at = candidates.find(isFree);
    if (at === undefined) return null;
    placed.push({ center: at, width });
    return at;
  });
}
