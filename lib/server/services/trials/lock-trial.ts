import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { lockTrialSchema } from '@/lib/schemas/trial';
import { findFirstVisit } from '../../data/planting-progress';
import { lockTrialRow } from '../../data/trial';
import { askAbout } from '../../operations/ask-about';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { holdSeenTrial } from './hold-seen-trial';

async function service(context: WriteContext): Promise<Written> {
  const { tx, actor, operation, clock } = context;
  const { trial } = await holdSeenTrial(context, operation.thingId);
  if (trial.lockedAt) throw new AppError('locked');
  assertVersion(trial.version, operation.baseVersion);
  const firstVisit = await findFirstVisit(tx, { organisationId: actor.organisationId, plantingId: trial.plantingId });
  askAbout(
    firstVisit
      ? [{ rule: 'locked-after-counts', about: trial.id, sentence: `Rows of this planting were counted from ${dateText(firstVisit.on)} on, before this plan is locked. Were main figure, reference and layout fixed before that?` }]
      : [],
    operation.confirmations,
  );
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
