import { segmentsRead } from '@/lib/schemas/tape-laid';
import { tapePositions } from '@/lib/schemas/tape-positions';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import type { TapeDraft } from '@/lib/client/round/tape-draft';
import { MissingSeed } from '@/components/tape/missing-seed';
import { Seedling } from '@/components/tape/seedling';
import { tapeTexts } from '@/lib/texts/round-tape-texts';

const width = 366;
const tapeTop = 40;
const tapeHeight = 14;
const edge = 6;

/** The row as it has been read so far, lying, on its tape: small enough to leave the keys where they are. */
export function TapeStrip({ draft, lengthInches, earlinessOf }: { draft: TapeDraft; lengthInches: number; earlinessOf: (marker: string | null) => number | null }) {
  const { unit, places } = draft;
  const read = places.map((place) => {
    const parsed = unit === null ? { ok: false as const } : parseTapePlace(place.typed, unit);
    return parsed.ok && unit !== null ? placeInches(parsed.thousandths, unit) : 0;
  });
  const laid = tapePositions(read, { readFrom: draft.readFrom, zeroAt: draft.zeroAt, segmentStarts: draft.segmentStarts.filter((start) => start < places.length) }, lengthInches);
  const reach = Math.max(lengthInches, 1, ...laid.map((place) => place.positionInches));
  const xOf = (inches: number) => edge + (inches / reach) * (width - 2 * edge);
  const cuts = segmentsRead(places.length, draft.segmentStarts);
  return (
    <svg role="img" aria-label={tapeTexts.drawing(places.length)} viewBox={`0 0 ${width} ${tapeTop + tapeHeight + 2}`} className="block h-auto w-full">
      <rect x={edge} y={tapeTop} width={width - 2 * edge} height={tapeHeight} strokeWidth={1.2} className="fill-bone stroke-ink" />
      {laid.map(({ order, positionInches }) => {
        const place = places[order];
        if (!place) return null;
        const x = xOf(positionInches);
        const earliness = earlinessOf(place.marker);
        if (place.kind === 'missing') return <MissingSeed key={order} x={x} y={tapeTop - 8} size={1} />;
        return (
          <Seedling key={order} x={x} y={tapeTop} height={10 + 22 * (earliness ?? 0.3)} grows="up" look={place.kind === 'late' ? 'late' : earliness === null ? 'unknown' : 'on-time'} size={order === draft.changing ? 1.3 : 0.8} />
        );
      })}
      {draft.segmentStarts.map((start) => {
        const after = laid.find((place) => place.order === start);
        return after && cuts[start] !== 0 ? <path key={start} d={`M${(xOf(after.positionInches) - 4).toFixed(1)} ${tapeTop - 4}v${tapeHeight + 8}`} fill="none" strokeWidth={3} strokeDasharray="3 2" className="stroke-ink" /> : null;
      })}
    </svg>
  );
}
