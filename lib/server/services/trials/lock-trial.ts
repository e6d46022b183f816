import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { lockTrialSchema } from '@/lib/schemas/trial';
import { lockTrialRow } from '../../data/trial';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { findSeenTrial } from './find-seen-trial';

async function service(context: WriteContext): Promise<Written> {
  const { tx, actor, operation, clock } = context;
  const { trial } = await findSeenTrial(context, operation.thingId);
  if (trial.lockedAt) throw new AppError('locked');
  assertVersion(trial.version, operation.baseVersion);
  const locked = await lockTrialRow(tx, {
    organisationId: actor.organisationId,
    trialId: trial.id,
    version: trial.version,
    personId: actor.personId,
    at: clock.now().toISOString(),
  });
  if (!locked) throw new AppError('conflict', { standingVersion: trial.version + 1 });
  return { version: trial.version + 1 };
}

/** Main figure, reference and layout are fixed from here on: what is chosen after seeing the counts proves nothing. */
export const lockTrial = defineOperation({ kind: 'trial.lock', version: 1, action: 'trials.write', body: lockTrialSchema, service });
