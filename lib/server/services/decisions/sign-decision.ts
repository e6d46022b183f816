import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { frozenDecisionSchema } from '@/lib/schemas/replant';
import { signDecisionSchema, type SignDecisionInput } from '@/lib/schemas/replant-sheet';
import { insertDecision, listDecisions } from '../../data/decision';
import { lockPlanting } from '../../data/planting';
import { contentHash } from '../../operations/content-hash';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { basisInPlanting, readReplantRecords } from '../replant/read-replant';

/**
 * Signs what stood on the screen and freezes it. The basis is worked out anew; when it is no longer what the person read,
 * nothing is signed. The same choice on the same basis is signed once; another choice, or another basis, is a new decision.
 */
async function service(
  context: WriteContext,
  { plantingId, zoneId, decided, signedName, basisHash }: SignDecisionInput,
): Promise<Written> {
  const { tx, actor, clock, operation } = context;
  const { organisationId } = actor;
  const { farm } = await findSeenPlanting(context, plantingId);
  // Two people who sign at one moment are taken one after the other, so that the second reads what the first signed.
  await lockPlanting(tx, { organisationId, plantingId });
  const basis = basisInPlanting(await readReplantRecords(context, plantingId), zoneId);
  if (contentHash(basis) !== basisHash) throw new AppError('basis-changed');
  if (basis.answer.kind !== 'value') {
    throw new AppError('bad-input', {
      sentence: 'There is no answer to sign yet. Type the figures that are named as missing first.',
    });
  }
  const [standing] = (await listDecisions(tx, { organisationId, plantingId })).filter(
    (each) => each.zoneId === zoneId,
  );
  if (standing && standing.basisHash === basisHash && standing.decided === decided) {
    throw new AppError('already-there', {
      sentence: `${standing.signedName} has signed this on these very numbers. Nothing was signed twice.`,
    });
  }
  const frozen = frozenDecisionSchema.parse({ version: 1, signedOn: clock.today(farm.timeZone), basis });
  const added = await insertDecision(tx, {
    id: operation.thingId,
    plantingId,
    zoneId,
    recommended: basis.answer.recommendation,
    decided,
    signedName,
    signedAt: clock.now().toISOString(),
    frozen,
    basisHash,
    ...originColumns(context),
  });
  if (!added) throw new AppError('operation-reused');
  return { version: 1 };
}

export const signDecision = defineOperation({
  kind: 'decision.sign',
  version: 1,
  action: 'decision.sign',
  body: signDecisionSchema,
  service,
});
