import { AppError } from '@/lib/errors/app-error';

/** An edit must name the version it was made on; made on an older one, it has lost and is kept to be settled. */
export function assertVersion(standingVersion: number, baseVersion: number | null): void {
  if (baseVersion === null) {
    throw new AppError('bad-input', { fields: [{ path: 'baseVersion', message: 'A change names the version it was made on.' }] });
  }
  if (baseVersion !== standingVersion) throw new AppError('conflict', { standingVersion });
}
