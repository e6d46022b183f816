import { z } from 'zod';
import { timeZoneSchema } from './operation';
import { emailSchema, newPasswordSchema } from './password';
import { unitSystems } from './vocabulary';

export const signInSchema = z.object({
  email: emailSchema,
  password: z.string().min(1, 'Type your password.').max(1000),
});

export const changePasswordSchema = z.object({
  current: z.string().min(1, 'Type your present password.').max(1000),
  next: newPasswordSchema,
});

export const preferencesSchema = z.object({ units: z.enum(unitSystems) });

export const openLinkSchema = z.object({
  secret: z.string().min(20).max(100),
  name: z.string().trim().min(1, 'Type your name.').max(100).optional(),
  email: emailSchema.optional(),
  organisationName: z.string().trim().min(1, 'Name the account, such as the crop service or farm.').max(100).optional(),
  timeZone: timeZoneSchema.optional(),
  password: newPasswordSchema,
});
export type OpenLinkInput = z.infer<typeof openLinkSchema>;
