import { countText } from '@/lib/format/count-text';
import type { TapeEntryKind, TapeUnit } from '@/lib/schemas/vocabulary';

const units: Record<TapeUnit, string> = { in: 'running inches', 'ft-in': 'feet and inches', 'ft-tenths': 'feet and tenths', cm: 'centimeters' };
const kinds: Record<TapeEntryKind, string> = { plant: 'Plant', late: 'Late', double: 'Double', missing: 'Missing' };

export const tapeTexts = {
  title: 'Tape sheet',
  which: 'Which tape is in your hand?',
  units,
  step: 'Read to the nearest',
  steps: { half: 'half', quarter: 'quarter', tenth: 'tenth' },
  zeroAt: 'The tape begins',
  zeros: { mark: 'at the peg', plant: 'at the first plant' },
  readFrom: 'Read from',
  ends: { start: 'the start peg', 'far-end': 'the far end' },
  begin: 'Begin at the first plant',
  goOn: 'Go on',
  change: 'Tape',
  kinds,
  leaf: (stage: string) => `V${stage}`,
  noLeaf: 'leaf',
  leafMore: 'Half a leaf collar more',
  leafLess: 'Half a leaf collar less',
  marker: 'Marker of this plant',
  noMarker: 'none',
  next: 'Next',
  put: 'Put',
  back: 'Delete',
  undo: 'Undo',
  cut: 'Cut here',
  cutGone: 'No cut here',
  remove: 'Take out',
  keep: (places: number) => `Keep ${places}`,
  none: 'Type the place of the first plant.',
  plants: (plants: number, counted: number | null) =>
    counted === null
      ? `${countText(plants, 'plant')} on the tape`
      : plants === counted
        ? `${countText(plants, 'plant')} on the tape, as counted`
        : `${countText(plants, 'plant')} on the tape, ${counted} counted`,
  place: (place: string, kind: TapeEntryKind, marker: string | null) => [place, kind === 'plant' ? null : kinds[kind].toLowerCase(), marker].filter(Boolean).join(', '),
  places: 'Places on the tape',
  needPlaces: 'Type at least one place.',
  unfinished: 'Press Next to take the place that is typed, or delete it.',
  fromLast: (day: number) => `These are the places of day ${day}. Go through them: change, take out, add.`,
  drawing: (places: number) => `The row as read so far, ${countText(places, 'place')}`,
  feetAndTenths: 'These look like feet and tenths. Which tape is in your hand?',
  stayInches: 'Running inches',
  areTenths: 'Feet and tenths',
} as const;
