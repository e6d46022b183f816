import { AppError } from './app-error';

type DatabaseFault = { code: string; constraint?: string | undefined };

function faultOf(error: unknown): DatabaseFault | undefined {
  for (let each: unknown = error, depth = 0; each instanceof Error && depth < 4; each = each.cause, depth += 1) {
    const { code, constraint } = each as Error & { code?: unknown; constraint?: unknown };
    if (typeof code === 'string') return { code, constraint: typeof constraint === 'string' ? constraint : undefined };
    // The pool's own time-out carries no code, nor does a query on a connection that has just dropped.
    if (/timeout exceeded when trying to connect|Connection terminated|is not queryable/.test(each.message)) return { code: '08006' };
  }
  return undefined;
}

const unavailable = /^(08|53|57|58|40)|^(55P03|25P0[23]|ECONN|ENOTFOUND|ETIMEDOUT|EPIPE)/;

/**
 * What the database refused, in the words of the catalogue. A constraint is the last guard behind the schemas and services,
 * so its answer is short; what cannot be told is left as it is. The driver's own message carries parameters and is never shown.
 */
export function appErrorFromDatabase(error: unknown): AppError | undefined {
  const fault = faultOf(error);
  if (!fault) return undefined;
  if (fault.code === '23505') return new AppError('already-there');
  if (fault.code === '23503') return new AppError('not-found');
  if (fault.code === '23514' || fault.code === '23502' || fault.code.startsWith('22')) {
    return new AppError('bad-input', { fields: [{ path: '', message: `A value was refused${fault.constraint ? ` (${fault.constraint.replaceAll('_', ' ')})` : ''}. Check what you typed.` }] });
  }
  return unavailable.test(fault.code) ? new AppError('busy') : undefined;
}
