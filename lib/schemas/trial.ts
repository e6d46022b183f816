import { z } from 'zod';
import { nameSchema } from './farm';
import { comparisonRules, layoutKinds, mainFigures } from './vocabulary';

export const settingsMost = 24;
export const blocksMost = 12;
export const randomSeedMost = 2_147_483_647;

/** A layout as it was drawn on the screen. The server draws it again from the seed and refuses one that differs. */
export const layOutTrialSchema = z.object({
  plantingId: z.uuid(),
  studyId: z.uuid(),
  studyName: nameSchema('study'),
  /** The layout that this one replaces, so that two people who draw at once do not wipe each other out unseen. */
  replacesTrialId: z.uuid().nullable().default(null),
  layout: z.enum(layoutKinds),
  mainFigure: z.enum(mainFigures, 'Choose the main figure.'),
  comparisonRule: z.enum(comparisonRules, 'Choose how settings are compared.'),
  settingIds: z.array(z.uuid()).min(2, 'Choose at least two settings.').max(settingsMost, `At most ${settingsMost} settings in one trial.`),
  referenceSettingId: z.uuid('Choose the reference.'),
  randomSeed: z.number().int().min(0).max(randomSeedMost),
  blocks: z
    .array(z.object({ id: z.uuid(), strips: z.array(z.object({ id: z.uuid(), settingId: z.uuid() })).min(2).max(settingsMost) }))
    .min(1, 'Lay out at least one block.')
    .max(blocksMost, `At most ${blocksMost} blocks.`),
});
export type LayOutTrialInput = z.output<typeof layOutTrialSchema>;

export const lockTrialSchema = z.object({});

export const asPlantedSchema = z.object({
  strips: z
    .array(
      z
        .object({ id: z.uuid(), stripId: z.uuid(), settingId: z.uuid().nullable(), reason: z.string().trim().min(1).max(300).nullable() })
        .refine((strip) => strip.settingId !== null || strip.reason !== null, { path: ['reason'], message: 'Say why the strip was lost.' }),
    )
    .min(1)
    .max(settingsMost * blocksMost),
});
export type AsPlantedInput = z.output<typeof asPlantedSchema>;
