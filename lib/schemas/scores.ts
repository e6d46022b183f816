import { z } from 'zod';
import { drawnPlantSchema } from './drawn-plant';
import { figuresSchema, penaltiesSchema, standIntervalSchema } from './figures';
import { outcomeSchema } from './outcome';
import { plantingFactsSchema } from './planting-facts';
import { scoredGroupSchema } from './scored-group';
import { rowEnds, tapeEntryKinds, tapeUnits } from './vocabulary';

/** The scores of a planting as they travel: every level at once, so that a screen shows one reading of the field. */
const number = z.number();

/** Which setting a strip counts for: as it was planted, as planned where nobody has said, or none because it was lost. */
export const settingBases = ['as-planted', 'as-planned', 'lost'] as const;
export type SettingBasis = (typeof settingBases)[number];

const scoredZoneSchema = scoredGroupSchema.extend({ zoneId: z.string().nullable(), name: z.string().nullable(), acres: number, areaShare: number });
export type ScoredZone = z.output<typeof scoredZoneSchema>;

const scoredSettingSchema = scoredGroupSchema.extend({
  settingId: z.string(),
  name: z.string(),
  seriesIndex: number,
  isReference: z.boolean(),
});
export type ScoredSetting = z.output<typeof scoredSettingSchema>;

const scoredStripSchema = scoredGroupSchema.extend({
  stripId: z.string(),
  number,
  blockNumber: number,
  settingId: z.string().nullable(),
  settingName: z.string().nullable(),
  settingBasis: z.enum(settingBases),
});
export type ScoredStrip = z.output<typeof scoredStripSchema>;

const countedVisitSchema = z.object({
  visitedOn: z.string(),
  visitedAt: z.string().nullable(),
  personName: z.string(),
  plantsUp: number,
  doubtful: number,
  days: number,
});
export type CountedVisit = z.output<typeof countedVisitSchema>;

const tapeFactsSchema = z.object({
  readOn: z.string(),
  personName: z.string(),
  tapeUnit: z.enum(tapeUnits),
  places: z.array(z.object({ typed: z.string(), kind: z.enum(tapeEntryKinds) })),
  plants: z.array(drawnPlantSchema),
});

const scoredRowSchema = z.object({
  rowSampleId: z.string(),
  label: z.string(),
  planterRow: number.nullable(),
  length: z.object({ typed: z.string(), unit: z.string(), inches: number }),
  startEnd: z.enum(rowEnds),
  farEnd: z.enum(rowEnds),
  stripNumber: number.nullable(),
  settingName: z.string().nullable(),
  settingBasis: z.enum(settingBases).nullable(),
  zoneName: z.string().nullable(),
  counts: z.array(countedVisitSchema),
  /** Counts of the same row and visit by a second person, which are not used. */
  countsNotUsed: number,
  tapeSheet: tapeFactsSchema.nullable(),
  /** Null where nothing was observed yet, or where what was observed cannot be. */
  scored: z.object({ figures: figuresSchema, penalties: penaltiesSchema }).nullable(),
  /** The input that cannot be; the row sample is then left out of every group. */
  impossible: z.string().nullable(),
});
export type ScoredRow = z.output<typeof scoredRowSchema>;

/** How finely a screen looks: the planting and its zones are always there, of the others one at a time. */
export const scoreLevels = ['planting', 'setting', 'strip', 'row-sample'] as const;
export type ScoreLevel = (typeof scoreLevels)[number];

export const scoresSchema = z.object({
  planting: plantingFactsSchema,
  level: z.enum(scoreLevels),
  /** How many there are at each level; a level without any is not offered. */
  things: z.record(z.enum(scoreLevels), number),
  whole: scoredGroupSchema,
  /** How the planting's stand was taken together where zones are drawn. */
  zoneStand: z
    .object({
      stand: outcomeSchema(z.object({ plantsPerAcre: number, interval: outcomeSchema(standIntervalSchema) })),
      /** Acres of the field that lie in no zone and have no row sample. */
      acresNotSampled: number,
      /** Row samples in no zone where the zones leave no other ground. */
      rowSamplesOutside: number,
    })
    .nullable(),
  zones: z.array(scoredZoneSchema),
  settings: z.array(scoredSettingSchema),
  strips: z.array(scoredStripSchema),
  rowSamples: z.array(scoredRowSchema),
  notes: z.object({
    notCounted: z.array(z.string()),
    impossible: z.array(z.object({ label: z.string(), field: z.string() })),
    countsNotUsed: number,
    rowSamplesOfLostStrips: number,
  }),
});
export type Scores = z.output<typeof scoresSchema>;
