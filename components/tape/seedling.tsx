type SeedlingProps = {
  x: number;
  y: number;
  /** How far it reaches from the tape. */
  height: number;
  /** Where it grows: up from a lying tape, or to the left of an upright one. */
  grows: 'up' | 'left';
  look: 'on-time' | 'late' | 'unknown';
  size?: number;
};

/** One plant: two leaves when it came with the others, an open head when late, a solid dot when nobody saw its day. */
export function Seedling({ x, y, height, grows, look, size = 1 }: SeedlingProps) {
  const turn = grows === 'left' ? ' rotate(-90)' : '';
  const headRadius = 3.6;
  const stemEnd = look === 'late' ? height - headRadius * 2 * size : height;
  return (
    <g transform={`translate(${x.toFixed(1)} ${y.toFixed(1)})${turn}`}>
      <path
        d={`M0 0V${(-stemEnd).toFixed(1)}`}
        fill="none"
        strokeWidth={1.6 * size}
        className={look === 'late' ? 'stroke-flag' : 'stroke-ink'}
      />
      {look === 'on-time' ? (
        <path
          transform={`translate(0 ${(-height).toFixed(1)}) scale(${size})`}
          d="M0 1.5C-1.8-.5-3.2-3.8-6.2-4.2C-6.2-.8-3.6 1.8 0 2.2C3.6 1.8 6.2-.8 6.2-4.2C3.2-3.8 1.8-.5 0 1.5Z"
          className="fill-ink"
        />
      ) : null}
      {look === 'late' ? (
        <circle
          cy={-height + headRadius * size}
          r={headRadius * size}
          fill="none"
          strokeWidth={1.8 * size}
          className="stroke-flag"
        />
      ) : null}
      {look === 'unknown' ? <circle cy={-height} r={3 * size} className="fill-ink" /> : null}
    </g>
  );
}
