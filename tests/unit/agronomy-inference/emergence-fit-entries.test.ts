import { describe, expect, it } from 'vitest';
import { bestEmergenceFit } from '@/lib/agronomy/inference/emergence-fit';
import { emergenceFitEntries } from '@/lib/agronomy/register/emergence-fit-entries';
import type { WorkedExample } from '@/lib/agronomy/register/register-entry';
import { seedAccount } from '@/lib/agronomy/seed-account';
import { answerOf } from '../agronomy/answer-of';

type Inputs = WorkedExample['inputs'];
const one = (inputs: Inputs, name: string) => inputs[name] as number;
const many = (inputs: Inputs, name: string) => inputs[name] as readonly number[];

/** How each worked example is figured again by the code it explains. */
const again: Record<string, (inputs: Inputs) => Record<string, number>> = {
  'emergence-fit': (inputs) => {
    const { best } = answerOf(bestEmergenceFit(many(inputs, 'lower').map((afterDays, index) => ({ afterDays, byDays: many(inputs, 'upper')[index] ?? null, plants: many(inputs, 'count')[index] ?? 0 }))));
    return { half: best.daysTo50.estimate, spread: best.spreadDays.estimate, aic: best.aic };
  },
  'where-the-seeds-went': (inputs) => {
    const account = answerOf(seedAccount([{ seeds: one(inputs, 'seeds'), onTime: one(inputs, 'onTime'), late: one(inputs, 'late'), dayNotSeen: 0, doubles: one(inputs, 'doubles'), digs: ['no-seed', 'seed-rotten'] }]));
    return { onTime: account.onTime.share, late: account.late.share, missing: account.missing.share, noSeed: account.dug['no-seed']?.share ?? NaN, notAccountedFor: account.notAccountedFor.share };
  },
};

describe('the register of smooth curves and seeds', () => {
  it.each(emergenceFitEntries.map((entry) => [entry.id, entry] as const))('figures its worked example again: %s', (id, entry) => {
    const figured = again[id]?.(entry.workedExample.inputs) ?? {};
    expect(Object.keys(figured).sort()).toEqual(Object.keys(entry.workedExample.expected).sort());
    for (const [name, expected] of Object.entries(entry.workedExample.expected)) {
      expect(Math.abs((figured[name] ?? NaN) - expected)).toBeLessThanOrEqual(entry.workedExample.tolerance + 1e-12);
    }
  });
});
