import 'server-only';
import { z } from 'zod';

const s3Names = ['S3_ENDPOINT', 'S3_BUCKET', 'S3_REGION', 'S3_ACCESS_KEY_ID', 'S3_SECRET_ACCESS_KEY'] as const;

const environmentSchema = z.object({
  DATABASE_URL: z.string().min(1, 'DATABASE_URL is needed: the address of the database for the application role.'),
  SESSION_SECRET: z.string().min(32, 'SESSION_SECRET is needed: at least 32 random characters.'),
  /** The address people type, where the server stands behind something that ends TLS. */
  ORIGIN: z.url().optional(),
  /** Where photos lie, unless a store that several servers share is named. */
  PHOTO_FOLDER: z.string().min(1).optional(),
  S3_ENDPOINT: z.url().optional(),
  S3_BUCKET: z.string().min(1).optional(),
  S3_REGION: z.string().min(1).optional(),
  S3_ACCESS_KEY_ID: z.string().min(1).optional(),
  S3_SECRET_ACCESS_KEY: z.string().min(1).optional(),
}).superRefine((given, refinement) => {
  const missing = s3Names.filter((name) => given[name] === undefined);
  // A store that is half named would lose photos at the first one.
  if (missing.length === 0 || missing.length === s3Names.length) return;
  for (const name of missing) refinement.addIssue({ code: 'custom', path: [name], message: `${name} is needed where the others of the S3 store are given.` });
});
export type Environment = z.infer<typeof environmentSchema>;

let parsed: Environment | undefined;

/** The environment, parsed once at first use; a missing value is said by name. */
export function environment(): Environment {
  parsed ??= environmentSchema.parse(process.env);
  return parsed;
}
