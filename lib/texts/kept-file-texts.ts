import { countText } from '@/lib/format/count-text';

/** The words of reading in at the office what a phone saved to a file. */
export const keptFileTexts = {
  title: 'Read in a file from a phone',
  lead: "A phone that cannot send saves its unsent work to a file. Read in here, every entry stands under its author's name. What has arrived already is told apart and not doubled.",
  choose: 'The file that the phone saved',
  hint: 'Its name begins with rowrise-kept.',
  notOurs: 'This is not a file that a phone of Rowrise saved. Choose the one whose name begins with rowrise-kept.',
  newer: 'This file was saved by a newer version. Update this installation first; the file keeps.',
  otherOrganisation: (count: number) => `${countText(count, 'entry', 'entries')} of the file ${count === 1 ? 'belongs' : 'belong'} to another account and ${count === 1 ? 'is' : 'are'} left out.`,
  what: (entries: number, photos: number, name: string) => `${countText(entries, 'entry', 'entries')} and ${countText(photos, 'photo')} of ${name}.`,
  read: 'Read in',
  reading: 'Reading in',
  progress: (done: number, all: number) => `${done} of ${all}`,
  done: (applied: number, known: number, refused: number) =>
    [`${countText(applied, 'entry', 'entries')} taken`, known > 0 ? `${known} had arrived already` : null, refused > 0 ? `${refused} not taken` : null].filter(Boolean).join(', ') + '.',
  photosDone: (taken: number, all: number) => `${taken} of ${countText(all, 'photo')} taken.`,
  notTaken: 'Not taken',
  stopped: 'No answer from the server. What was taken is taken; read the same file in again, nothing is doubled.',
  link: 'Read in a file from a phone',
} as const;
