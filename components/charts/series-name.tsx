import { SeriesMarker } from './series-marker';
import { seriesMost, seriesStyle } from './series-style';

type SeriesNameProps = { index: number; name: string };

/** A setting's name behind a piece of its line, so that it is known again on every picture. */
export function SeriesName({ index, name }: SeriesNameProps) {
  return (
    <>
      <SeriesSample index={index} />
      {name}
    </>
  );
}

/** A piece of a setting's line with its marker; nothing where there are more settings than lines to tell apart. */
export function SeriesSample({ index }: { index: number }) {
  if (index >= seriesMost) return null;
  const { color, dash } = seriesStyle(index);
  return (
    <svg aria-hidden="true" width={30} height={12} viewBox="0 0 30 12" className="mr-2 inline-block shrink-0 align-baseline">
      <line x1={0} x2={30} y1={6} y2={6} stroke={color} strokeWidth={2.2} strokeDasharray={dash} />
      <SeriesMarker index={index} x={15} y={6} size={4} />
    </svg>
  );
}
