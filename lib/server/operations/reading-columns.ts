import type { Reading } from '@/lib/schemas/reading';

type Columns<Name extends string> = Record<`${Name}Typed`, string | null> &
  Record<`${Name}Unit`, Reading['unit'] | null> &
  Record<`${Name}Thousandths`, number | null>;

type FilledColumns<Name extends string> = Record<`${Name}Typed`, string> &
  Record<`${Name}Unit`, Reading['unit']> &
  Record<`${Name}Thousandths`, number>;

/** The three columns of a reading, under the name the table gives it; all empty where there is none. */
export function readingColumns<Name extends string>(name: Name, reading: Reading): FilledColumns<Name>;
export function readingColumns<Name extends string>(name: Name, reading: Reading | null): Columns<Name>;
export function readingColumns<Name extends string>(name: Name, reading: Reading | null): Columns<Name> {
  return {
    [`${name}Typed`]: reading?.typed ?? null,
    [`${name}Unit`]: reading?.unit ?? null,
    [`${name}Thousandths`]: reading?.thousandths ?? null,
  } as Columns<Name>;
}

/** A reading out of its three columns; null where there is none. */
export function readingOf(typed: string | null, unit: Reading['unit'] | null, thousandths: number | null): Reading | null {
  return typed === null || unit === null || thousandths === null ? null : { typed, unit, thousandths };
}
