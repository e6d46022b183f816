import { describe, expect, it } from 'vitest';
import { checkThenInsert, receiptBeforeChange } from '../../scripts/chaos/broken-apply';
import { withoutKeys } from '../../scripts/chaos/controls';
import { chaosInProcess } from '../support/chaos-in-process';

const nothingWrong = { lost: 0, doubled: 0, invented: 0, altered: 0, apart: 0, told: [] };
const little = { phones: 4, entriesEach: 24, faultMs: 1_500 };

describe('what phones enter while connections drop, answers get lost and batches come twice', () => {
  it('stands once and as entered, with one receipt and one audit event each', { timeout: 60_000 }, async () => {
    const outcome = await chaosInProcess({ phones: 6, entriesEach: 40, faultMs: 3_000, portalShare: 0.1 });
    expect(outcome.complaints).toEqual([]);
    expect(outcome.waiting).toBe(0);
    expect(outcome.ledger).toMatchObject({ made: 240, ...nothingWrong });
    // A run in which nothing was struck would hold nothing.
    expect(outcome.dropped).toBeGreaterThan(5);
  });

  it('is lost, and this says so, where the receipt is committed before the change', { timeout: 60_000 }, async () => {
    expect((await chaosInProcess({ ...little, apply: receiptBeforeChange })).ledger.lost).toBeGreaterThan(0);
  });

  it('is doubled, and this says so, where the server looks first and inserts afterwards', { timeout: 60_000 }, async () => {
    expect((await chaosInProcess({ ...little, apply: checkThenInsert, breakDatabase: withoutKeys, habits: { twinShare: 0.5 } })).ledger.doubled).toBeGreaterThan(0);
  });

  it('is doubled, and this says so, where the unique keys are gone', { timeout: 60_000 }, async () => {
    expect((await chaosInProcess({ ...little, breakDatabase: withoutKeys })).ledger.doubled).toBeGreaterThan(0);
  });

  it('is lost, and this says so, where a phone forgets on any 2xx', { timeout: 60_000 }, async () => {
    expect((await chaosInProcess({ ...little, portalShare: 0.3, habits: { forgetsOnAny2xx: true } })).ledger.lost).toBeGreaterThan(0);
  });
});
