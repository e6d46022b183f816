import { describe, expect, it } from 'vitest';
import { methodGroups } from '@/components/methods/method-groups';
import type { TryDefinition } from '@/components/methods/try-definition';
import { tryDegreeDays } from '@/components/methods/try-degree-days';
import { tryLatePlants } from '@/components/methods/try-late-plants';
import { tryRowLength } from '@/components/methods/try-row-length';
import { trySpacing } from '@/components/methods/try-spacing';
import { tryStand } from '@/components/methods/try-stand';
import { tryYieldGrid } from '@/components/methods/try-yield-grid';
import { wholeRegister } from '@/lib/agronomy/whole-register';

function answerOf({ fields, answer }: TryDefinition, typed: Record<string, string> = {}) {
  return answer({ ...Object.fromEntries(fields.map((field) => [field.key, field.initial])), ...typed });
}

const textOf = (definition: TryDefinition, typed?: Record<string, string>) => {
  const answer = answerOf(definition, typed);
  return answer.kind === 'answer' ? answer.text : answer;
};

describe('the forms to try formulas with', () => {
  it('open with the published examples and give their published results', () => {
    // Purdue: 80/55 °F is 17.5. Tennessee, Missouri, Wisconsin: 17 ft 5 in for 30-inch rows.
    expect(textOf(tryDegreeDays)).toBe('17.5 °F degree days');
    expect(textOf(tryRowLength)).toBe('17 ft 5 in');
    // 31 plants in 17 ft 5 in are about 31,000 by the formula of the extension services.
    expect(textOf(tryStand)).toBe('31,013 plants per acre');
    // Nafziger, Carter and Graham 1991.
    expect(textOf(tryLatePlants)).toBe('93.2 % of the even stand');
    expect(textOf(tryLatePlants, { share: '50', days: '21' })).toBe('78.0 % of the even stand');
    // Nafziger 1994 as printed by Purdue: 30 April, 20,000 plants.
    expect(textOf(tryYieldGrid)).toBe('92 % of the field’s best yield');
  });

  it('find mean, SD, loss and stand of the printed tape readings', () => {
    // Printed with the SSMG-37 guide: 6.8 in, 5.1 in, 12.5 bu/ac; 30,748 is 10 spaces over 68 in of a 30-inch row.
    expect(answerOf(trySpacing)).toMatchObject({
      kind: 'answer',
      text: 'mean 6.8 in, SD 5.1 in',
      facts: [{ text: '12.5 bu/ac' }, { text: '75 %' }, { text: '30,748 plants per acre (10 plants held)' }],
    });
    const inCentimeters = [0, 2, 17, 33, 38, 39, 44, 52, 55, 60, 68].map((inches) => String(inches * 2.54)).join(' ');
    expect(textOf(trySpacing, { readings: inCentimeters, tape: 'cm' })).toBe('mean 17.3 cm, SD 13.0 cm');
  });

  it('say what is too little or beyond the domain, and never a number in its place', () => {
    expect(answerOf(trySpacing, { readings: '0 6' })).toMatchObject({ kind: 'insufficient', text: expect.stringContaining('Too little to say: needs') });
    expect(answerOf(tryLatePlants, { days: '30' })).toMatchObject({ kind: 'insufficient', text: expect.stringContaining('27 days') });
    expect(textOf(tryYieldGrid, { plants: '6,000' })).toBe('at most 68 % of the field’s best yield');
    expect(answerOf(tryYieldGrid, { month: '6', day: '20' })).toMatchObject({ detail: expect.stringContaining('the grid ends on 9 June') });
  });

  it('names the field that cannot be', () => {
    expect(answerOf(tryDegreeDays, { high: '50', low: '60' })).toMatchObject({ kind: 'wrong', field: 'high' });
    expect(answerOf(tryDegreeDays, { high: 'warm' })).toMatchObject({ kind: 'wrong', field: 'high' });
    expect(answerOf(tryRowLength, { spacing: '0' })).toMatchObject({ kind: 'wrong', field: 'spacing' });
    expect(answerOf(tryStand, { doubtful: '32' })).toMatchObject({ kind: 'wrong', field: 'doubtful' });
    expect(answerOf(tryStand, { plants: '-3' })).toMatchObject({ kind: 'wrong', field: 'plants' });
    expect(answerOf(trySpacing, { readings: '0 17 2' })).toMatchObject({ kind: 'wrong', field: 'readings' });
    expect(answerOf(trySpacing, { readings: '0 x' })).toMatchObject({ kind: 'wrong', field: 'readings' });
    expect(answerOf(tryLatePlants, { share: '130' })).toMatchObject({ kind: 'wrong', field: 'share' });
    expect(answerOf(tryYieldGrid, { month: '4', day: '31' })).toMatchObject({ kind: 'wrong', field: 'day' });
    for (const definition of [tryDegreeDays, tryRowLength, tryStand, trySpacing, tryLatePlants, tryYieldGrid]) {
      const emptied = Object.fromEntries(definition.fields.map((field) => [field.key, '']));
      expect(answerOf(definition, emptied).kind).not.toBe('answer');
    }
  });

  it('take a decimal comma, thousands, fractions and feet and inches', () => {
    expect(textOf(tryDegreeDays, { high: '80,0' })).toBe('17.5 °F degree days');
    expect(textOf(tryRowLength, { spacing: '76,2 cm' })).toBe('17 ft 5 in');
    expect(textOf(tryStand, { length: "17'5\"" })).toBe('31,013 plants per acre');
  });
});

describe('the Methods page', () => {
  it('shows every entry of the whole register once', () => {
    const shown = methodGroups().flatMap((group) => group.entries.map((entry) => entry.id));
    expect([...shown].sort()).toEqual(wholeRegister.map((entry) => entry.id).sort());
  });
});
