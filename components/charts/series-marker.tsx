import { seriesStyle } from './series-style';

type SeriesMarkerProps = { index: number; x?: number; y?: number; size?: number };

/** The marker of a series, centered on its point; open ones are filled with the paper, so that lines do not cross them. */
export function SeriesMarker({ index, x = 0, y = 0, size = 4 }: SeriesMarkerProps) {
  const { color, marker } = seriesStyle(index);
  const s = size;
  const paths = {
    square: `M${-s} ${-s}H${s}V${s}H${-s}Z`,
    triangle: `M0 ${-s * 1.25}L${s * 1.2} ${s * 0.9}H${-s * 1.2}Z`,
    diamond: `M0 ${-s * 1.35}L${s * 1.35} 0L0 ${s * 1.35}L${-s * 1.35} 0Z`,
    cross: `M${-s} ${-s}L${s} ${s}M${-s} ${s}L${s} ${-s}`,
  };
  return (
    <g transform={`translate(${x} ${y})`}>
      {marker === 'dot' ? <circle r={s} fill={color} /> : null}
      {marker === 'ring' ? <circle r={s} fill="var(--paper)" stroke={color} strokeWidth={2} /> : null}
      {marker === 'cross' ? <path d={paths.cross} fill="none" stroke={color} strokeWidth={2.2} /> : null}
      {marker === 'square' || marker === 'triangle' || marker === 'diamond' ? (
        <path d={paths[marker]} fill={color} />
      ) : null}
    </g>
  );
}
