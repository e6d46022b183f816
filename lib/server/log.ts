import 'server-only';
import pino from 'pino';

/** JSON lines to standard output. Callers pass codes and ids, never bodies, parameters or secrets. */
export const log = pino({ level: process.env.LOG_LEVEL ?? 'info', base: undefined });
