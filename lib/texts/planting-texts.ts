import type { Crop, Tillage } from '@/lib/schemas/vocabulary';

/** The words of plantings: their facts, their season, their zones. */
export const plantingTexts = {
  crop: {
    corn: 'Corn', soybean: 'Soybean', sorghum: 'Sorghum', sunflower: 'Sunflower', cotton: 'Cotton', other: 'Another crop',
  } satisfies Record<Crop, string>,
  tillage: {
    'no-till': 'no-till', 'strip-till': 'strip-till', reduced: 'reduced tillage', conventional: 'conventional tillage',
  } satisfies Record<Tillage, string>,
  after: (crop: string, previous: string) => `${crop} after ${previous}`,
  planted: (day: string) => `planted ${day}`,
  rows: (spacing: string) => `${spacing} rows`,
  seeds: (rate: string) => `${rate} seeds`,
  seedsPerArea: (typed: string, per: string) => `${typed} seeds ${per}`,
  season: {
    notYet: 'not yet',
    day: (day: string) => `day ${day}`,
    days: (first: string, last: string) => `day ${first} to ${last}`,
    locked: 'locked',
    notLocked: 'not locked',
    settings: (text: string) => text,
    keep: 'keep, signed',
    replant: 'replant, signed',
    unsigned: 'not signed',
  },
} as const;
