import { countText } from '@/lib/format/count-text';
import type { TapeEntryKind, TapeReadFrom, TapeUnit, TapeZero } from '@/lib/schemas/vocabulary';

const noted: Record<Exclude<TapeEntryKind, 'plant'>, string> = { late: 'Late', double: 'Double', missing: 'One missing' };
const ends: Record<TapeReadFrom, string> = { start: 'the start', 'far-end': 'the far end' };
const zeros: Record<TapeZero, string> = { mark: 'at the peg', plant: 'at a plant' };

/** The words of the tape sheet on the phone. */
export const tapeTexts = {
  title: (label: string) => `Tape sheet of ${label}`,
  which: 'Which tape is in hand?',
  units: { in: 'Running inches', 'ft-in': 'Feet and inches', 'ft-tenths': 'Feet and tenths', cm: 'Centimeters' } satisfies Record<TapeUnit, string>,
  examples: { in: '68½', 'ft-in': "5'8½", 'ft-tenths': '5.7', cm: '172½' } satisfies Record<TapeUnit, string>,
  step: 'Read to the nearest',
  steps: { half: 'half', quarter: 'quarter', tenth: 'tenth' },
  zeroAt: 'Zero lies',
  zeros,
  readFrom: 'Read from',
  ends,
  chooseFirst: 'Choose the tape first.',
  begin: 'Begin',
  goOn: 'Go on',
  goThrough: (day: number, places: number) => `Go through day ${day}, ${countText(places, 'place')}`,
  beginNew: 'Begin an empty sheet',
  correctToday: (places: number) => `Correct today's sheet, ${countText(places, 'place')}`,
  change: (unit: TapeUnit) => `Change the tape, now ${tapeTexts.units[unit].toLowerCase()}`,
  inHand: (unit: TapeUnit) => ({ in: 'Inches', 'ft-in': 'Feet, inches', 'ft-tenths': 'Feet, tenths', cm: 'Centimeters' })[unit],
  laid: (zeroAt: TapeZero, readFrom: TapeReadFrom) => `zero ${zeros[zeroAt]}, from ${ends[readFrom]}`,
  noted,
  leaf: (stage: number | null) => (stage === null ? 'leaf' : `V${String(stage).replace(/^0\.5$/, '½').replace('.5', '½')}`),
  leafMore: 'Half a leaf collar more',
  leafLess: 'Half a leaf collar less',
  leafIs: (stage: number | null) => (stage === null ? 'Leaf stage not read' : `Leaf stage V${stage}`),
  marker: 'Marker of this plant',
  markerDay: (day: number) => `day ${day}`,
  noMarker: 'No marker',
  whatIs: 'What stands there',
  keys: 'Keys',
  next: 'Next',
  put: 'Put',
  stands: 'Still there',
  back: 'Delete',
  undo: 'Undo',
  feet: 'feet',
  cut: 'Cut here',
  cutGone: 'No cut here',
  remove: 'Take it out',
  insert: (place: string) => `Add one before ${place}`,
  keep: (places: number) => `Keep ${places}`,
  keepLabel: (places: number) => `Keep the sheet with ${countText(places, 'place')}`,
  empty: 'Type the place of the first plant, then Next.',
  plants: (plants: number, counted: number | null) => {
    const onTape = `${countText(plants, 'plant')} on the tape`;
    if (counted === null) return `${onTape}, no count yet`;
    const apart = Math.abs(plants - counted);
    return apart === 0 ? `${onTape}, as counted` : `${onTape}, ${counted} counted: ${apart} ${plants < counted ? 'fewer' : 'more'}`;
  },
  places: 'Places on the tape, the newest first',
  place: (order: number) => `Place ${order}`,
  before: (place: string) => `Before ${place}`,
  ofAll: (order: number, all: number) => `Place ${order} of ${all}, as it was`,
  changing: (order: number) => `Place ${order}, being changed`,
  onFrom: (distance: string) => `${distance} on`,
  here: 'Typed',
  nothingTyped: 'nothing typed',
  laidAnew: 'Cut: the tape was laid anew here',
  cutNext: 'laid anew',
  wrong: 'out of order',
  unread: (example: string) => `This tape reads such as ${example}. Mend the number.`,
  order: (place: string) => `${place} is not in the order of the tape.`,
  inOrder: 'Put it in order',
  needPlaces: 'Type at least one place.',
  toGo: (places: number) => `${countText(places, 'place')} of the earlier sheet ${places === 1 ? 'has' : 'have'} not been gone through. Keep ${places === 1 ? 'it' : 'them'} as before?`,
  drawing: (places: number) => `The row as read so far, ${countText(places, 'place')}`,
  feetAndTenths: 'These look like feet and tenths. Which tape is in hand?',
  areInches: 'Inches, as typed',
} as const;
