/** A piece torn out of the tape: two ragged edges with the ground between them. Across is the way over the tape, along the way it lies. */
export function TapeCut({ x, y, across, lies }: { x: number; y: number; across: number; lies: 'along' | 'upright' }) {
  const teeth = 4;
  const step = across / teeth;
  const edge = (offset: number) =>
    Array.from({ length: teeth + 1 }, (_, tooth) => {
      const along = offset + (tooth % 2 === 0 ? -1.6 : 1.6);
      const over = tooth * step;
      return lies === 'along' ? `${(x + along).toFixed(1)} ${(y + over).toFixed(1)}` : `${(x + over).toFixed(1)} ${(y + along).toFixed(1)}`;
    });
  const [near, far] = [edge(-3.5), edge(3.5)];
  return (
    <g>
      <path d={`M${near.join('L')}L${[...far].reverse().join('L')}Z`} className="fill-paper" />
      <path d={`M${near.join('L')}M${far.join('L')}`} fill="none" strokeWidth={1.2} className="stroke-ink" />
    </g>
  );
}
