type MissingSeedProps = { x: number; y: number; size?: number };

/** A cross where a seed never came. */
export function MissingSeed({ x, y, size = 1 }: MissingSeedProps) {
  const arm = 3.2 * size;
  return (
    <path
      d={`M${(x - arm).toFixed(1)} ${(y - arm).toFixed(1)}l${2 * arm} ${2 * arm}m0 ${-2 * arm}l${-2 * arm} ${2 * arm}`}
      fill="none"
      strokeWidth={1.4 * size}
      className="stroke-ink"
    />
  );
}
