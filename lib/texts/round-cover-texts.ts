import { countText } from '@/lib/format/count-text';

export const coverTexts = {
  inRow: 'In-row cover',
  transect: 'Field transect',
  howInRow: 'Lay the tape along the seed row. Look straight down at the same edge of each mark.',
  howTransect: 'Lay the tape slantwise over the rows. Look straight down at the same edge of each mark. At least three places tell a field.',
  whatCounts: 'A piece counts if it would stop a raindrop, about 1/8 inch.',
  residue: 'Residue',
  bare: 'Bare',
  undo: 'Undo',
  none: 'No mark read yet',
  soFar: (covered: number, read: number, percent: string) => `${covered} of ${read}, ${percent} %`,
  toGo: (marks: number) => `${countText(marks, 'mark')} to 100`,
  enough: '100 marks read',
  keep: (read: number) => `Keep ${countText(read, 'mark')}`,
  needOne: 'Read at least one mark.',
  few: (read: number) => `${countText(read, 'mark')} ${read === 1 ? 'tells' : 'tell'} little. Press Keep again to keep it so, or go on.`,
  strip: 'Where',
  whole: 'across the field',
  ofStrip: (number: number) => `strip ${number}`,
  taken: (count: number) => (count === 0 ? 'No transect of this planting yet.' : `${countText(count, 'transect')} of this planting so far.`),
} as const;
