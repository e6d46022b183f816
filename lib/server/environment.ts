import 'server-only';
import { z } from 'zod';

const environmentSchema = z.object({
  DATABASE_URL: z.string().min(1, 'DATABASE_URL is needed: the address of the database for the application role.'),
  SESSION_SECRET: z.string().min(32, 'SESSION_SECRET is needed: at least 32 random characters.'),
  /** The address people type, where the server stands behind something that ends TLS. */
  ORIGIN: z.url().optional(),
});
export type Environment = z.infer<typeof environmentSchema>;

let parsed: Environment | undefined;

/** The environment, parsed once at first use; a missing value is said by name. */
export function environment(): Environment {
  parsed ??= environmentSchema.parse(process.env);
  return parsed;
}
