import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Reading } from '@/lib/schemas/reading';
import { yesTo } from '../support/count-scene';
import { makeDecideScenes } from '../support/decide-scene';
import { atField, fieldBody, PlanScene, plantingBody, refusedAt, withAt, type Body, type PlanKind } from '../support/plan-scene';

let own: PlanScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(1);
  close = made.close;
  for (const scene of made.scenes) own = await new PlanScene(scene).settle();
});
afterAll(() => close());

const measured: [kind: PlanKind, path: string][] = [
  ['field', 'area'], ['planting', 'rowSpacing'], ['planting', 'seedingRate'], ['planting', 'tagGermination'], ['planting', 'intendedStand'], ['planting', 'fullYield'],
  ['planting', 'zones.0.area'], ['setting', 'pressure'], ['setting', 'workingDepth'], ['row-sample', 'samples.0.length'],
];

describe.each(measured)('of a %s, %s', (kind, path) => {
  it.each<[string, unknown, RegExp]>([
    ['left empty', { typed: '' }, /^Type the /],
    ['of blanks', { typed: '  ' }, /^Type the /],
    ['in letters', { typed: 'wide' }, /^Write the .* as a number such as /],
    ['with an exponent', { typed: '1e3' }, /^Write the .* as a number such as /],
    ['divided by zero', { typed: '1/0' }, /^Write the .* as a number such as /],
    ['below zero', { typed: '-5' }, /cannot be below zero/],
    ['of an absurd size', { typed: '99999999' }, /is expected between .*; this says 99999999/],
    ['in a unit nobody knows', { typed: '20 furlongs' }, /^Write the /],
    ['in a unit of something else', { typed: '20 kg' }, /is given in /],
    ['longer than any number', { typed: '1'.repeat(41) }, /too long/],
  ])('%s is refused at its field', async (_, value, message) => {
    const answer = await own.send(kind, withAt(own.body(kind), path, value));
    expect(refusedAt(answer)).toEqual(atField(path));
    expect(answer.fields?.[0]?.message).toMatch(message);
  });

  it('missing, or not as a form sends it, is refused at its field', async () => {
    for (const value of [undefined, 30, '30', [], {}, { typed: 30 }, { typed: '30', unit: 'furlong' }]) {
      const answer = await own.send(kind, withAt(own.body(kind), path, value));
      expect(answer).toMatchObject({ outcome: 'refused', code: 'bad-input' });
      expect(answer.fields?.every((field) => field.path === path || field.path.startsWith(`${path}.`))).toBe(true);
    }
  });
});

describe('what else a form holds', () => {
  const days = ['1989-12-31', '0001-01-01', '2027-05-21', '9999-12-31', '2026-02-30', '2026-13-01', '7 May 2026', '5/7/2026', '+012026-05-07', '', null, 20_260_507, undefined];
  const times = ['24:00', '7:30', '07:30:15', '7 am', '', 730, undefined];
  const names = ['', '   ', 'x'.repeat(101), 'two\nlines', null, 7, undefined];

  it.each<[PlanKind, string, readonly unknown[]]>([
    ['farm', 'name', names],
    ['farm', 'timeZone', ['', 'Mars/Olympus', 'x'.repeat(61), null, 5, undefined]],
    ['field', 'name', names],
    ['field', 'farmId', ['', 'home', null, undefined]],
    ['planting', 'plantedOn', days],
    ['planting', 'plantedAt', times],
    ['planting', 'crop', ['', 'barley', 'Corn', null, undefined]],
    ['planting', 'tillage', ['', 'moldboard', undefined]],
    ['planting', 'previousCrop', ['', ' ', 'x'.repeat(61), undefined]],
    ['planting', 'slowAfterDays', ['', '2', 0, -1, 1.5, null, undefined]],
    ['planting', 'veryLateAfterDays', ['', '14', 14.5, 61, null, undefined]],
    ['planting', 'zones.0.name', names],
    ['planting', 'zones.0.id', ['', 'low', null, undefined]],
    ['planting', 'zones', ['', null, {}, undefined]],
    ['setting', 'name', names],
    ['setting', 'phrase', ['', ' ', 'x'.repeat(121), null, undefined]],
    ['setting', 'cleaner', ['', 'spring', null, undefined]],
    ['setting', 'wheels', ['', 'square', undefined]],
    ['setting', 'pressureDirection', ['', 'sideways', undefined]],
    ['setting', 'adjustedFrom', ['', 'tailgate', undefined]],
    ['setting', 'note', ['', 'x'.repeat(501), undefined]],
    ['row-sample', 'samples.0.label', ['', ' ', 'x'.repeat(21), 'S7;2', 'S7\n2', null, 7, undefined]],
    ['row-sample', 'samples.0.planterRow', ['', '3', 0, -1, 1.5, 100, undefined]],
    ['row-sample', 'samples.0.startEnd', ['', 'fence', null, undefined]],
    ['row-sample', 'samples.0.farEnd', ['', 'fence', null, undefined]],
    ['row-sample', 'samples', ['', null, [], undefined]],
  ])('of a %s, %s is refused at its field', async (kind, path, values) => {
    for (const value of values) {
      const answer = await own.send(kind, withAt(own.body(kind), path, value));
      expect([value, refusedAt(answer)]).toEqual([value, atField(path)]);
      expect(answer.fields?.every((field) => field.message !== '')).toBe(true);
    }
  });

  it('names every field at once', async () => {
    const answer = await own.send('planting', plantingBody({ fieldId: own.fieldId, plantedOn: '', rowSpacing: { typed: 'wide' }, crop: 'barley' }));
    expect(refusedAt(answer).paths.sort()).toEqual(['crop', 'plantedOn', 'rowSpacing']);
  });

  it('takes slow, late and very late only where they rise', async () => {
    for (const limits of [{ slowAfterDays: 7 }, { lateAfterDays: 14 }, { lateAfterDays: 20 }]) {
      expect(refusedAt(await own.send('planting', plantingBody({ fieldId: own.fieldId, ...limits })))).toEqual(atField('lateAfterDays'));
    }
  });

  it('takes planting days from 1990 to a year ahead', async () => {
    for (const plantedOn of ['1990-01-01', '2024-02-29', '2027-05-20']) {
      expect((await own.send('planting', plantingBody({ fieldId: own.fieldId, plantedOn }))).outcome).toBe('applied');
    }
  });

  it('asks about zones that are larger together than their field, and takes them with the answer', async () => {
    const body = plantingBody({ fieldId: own.fieldId, zones: ['40', '22.5'].map((typed, index) => ({ id: v7(), name: `zone ${index}`, area: { typed } })) });
    const asked = await own.send('planting', body);
    expect(asked).toMatchObject({ outcome: 'refused', code: 'needs-confirmation', questions: [{ rule: 'zones-exceed-field', about: 'zones' }] });
    expect((await own.send('planting', body, { confirmations: yesTo(asked) })).outcome).toBe('applied');
  });

  it('leaves nothing of what was refused', async () => {
    const before = await own.rows(sql`select id from planting`);
    await own.send('planting', plantingBody({ fieldId: own.fieldId, zones: [{ id: v7(), name: '', area: { typed: '18' } }] }));
    expect(await own.rows(sql`select id from planting`)).toHaveLength(before.length);
  });
});

describe('a reading', () => {
  // A foot is 12 inches; a decimal comma is a point, and a comma before three digits parts thousands where areas and rates are typed.
  it.each<[PlanKind, string, Body, Reading]>([
    ['field', 'area', { typed: ' 62,5 ' }, { typed: '62,5', unit: 'acres', thousandths: 62_500 }],
    ['field', 'area', { typed: '1,234.5' }, { typed: '1,234.5', unit: 'acres', thousandths: 1_234_500 }],
    ['field', 'area', { typed: '25.1', unit: 'ha' }, { typed: '25.1', unit: 'ha', thousandths: 25_100 }],
    ['planting', 'rowSpacing', { typed: '17,5' }, { typed: '17,5', unit: 'in', thousandths: 17_500 }],
    ['planting', 'rowSpacing', { typed: '5 1/4' }, { typed: '5 1/4', unit: 'in', thousandths: 5_250 }],
    ['planting', 'rowSpacing', { typed: "2'6" }, { typed: "2'6", unit: 'in', thousandths: 30_000 }],
    ['planting', 'rowSpacing', { typed: '76', unit: 'cm' }, { typed: '76', unit: 'cm', thousandths: 76_000 }],
    ['planting', 'seedingRate', { typed: '84 000 per ha' }, { typed: '84 000 per ha', unit: 'per-ha', thousandths: 84_000_000 }],
    ['planting', 'tagGermination', { typed: '97,5 %' }, { typed: '97,5 %', unit: 'percent', thousandths: 97_500 }],
    ['planting', 'intendedStand', { typed: '31500' }, { typed: '31500', unit: 'per-acre', thousandths: 31_500_000 }],
    ['planting', 'fullYield', { typed: '12,5 t/ha' }, { typed: '12,5 t/ha', unit: 't/ha', thousandths: 12_500 }],
    ['planting', 'zones.0.area', { typed: '17½' }, { typed: '17½', unit: 'acres', thousandths: 17_500 }],
    ['setting', 'pressure', { typed: '20 psi' }, { typed: '20 psi', unit: 'psi', thousandths: 20_000 }],
    ['setting', 'workingDepth', { typed: '3/4' }, { typed: '3/4', unit: 'in', thousandths: 750 }],
    ['row-sample', 'length', { typed: "17'5" }, { typed: "17'5", unit: 'in', thousandths: 209_000 }],
    ['row-sample', 'length', { typed: '17 ft 5 1/2 in' }, { typed: '17 ft 5 1/2 in', unit: 'in', thousandths: 209_500 }],
    ['row-sample', 'length', { typed: '17’5”' }, { typed: '17’5”', unit: 'in', thousandths: 209_000 }],
    ['row-sample', 'length', { typed: '17,5' }, { typed: '17,5', unit: 'ft', thousandths: 17_500 }],
    ['row-sample', 'length', { typed: '5.31 m' }, { typed: '5.31 m', unit: 'm', thousandths: 5_310 }],
  ])('of a %s, %s, is kept and read back exactly as typed: %j', async (kind, path, typed, reading) => {
    const kept = async () => {
      if (kind === 'field') return (await own.field(await own.addField(withAt({}, path, typed)))).field;
      if (kind === 'planting') return (await own.plan(await own.addPlanting(withAt(plantingBody({ fieldId: own.fieldId }), path, typed)))).planting;
      if (kind === 'setting') return own.setting(await own.addSetting(withAt({}, path, typed)));
      const id = await own.addRowSample(own.plantingId, withAt({}, path, typed));
      return (await own.plan(own.plantingId)).rowSamples.find((each) => each.id === id);
    };
    expect(path.split('.').reduce<unknown>((inner, step) => (inner as Body)[step], await kept())).toEqual(reading);
  });

  it('that may stay open and was left open is none, not zero', async () => {
    const id = await own.addPlanting({ tagGermination: null, fullYield: null, plantedAt: null, previousCrop: null, tillage: null, zones: [] });
    expect((await own.plan(id)).planting).toMatchObject({ tagGermination: null, fullYield: null, plantedAt: null, previousCrop: null, tillage: null, zones: [] });
  });

  it('is the parser’s, whatever number is sent along', async () => {
    const id = await own.addField({ area: { typed: '62', unit: 'acres', thousandths: 1 } });
    expect((await own.field(id)).field.area).toEqual({ typed: '62', unit: 'acres', thousandths: 62_000 });
  });

  it('is changed together with what was typed', async () => {
    const id = await own.addField();
    await own.scene.must('owner', 'field.change', id, fieldBody({ area: { typed: '25,1 ha' } }), { baseVersion: 1 });
    expect((await own.field(id)).field).toMatchObject({ version: 2, area: { typed: '25,1 ha', unit: 'ha', thousandths: 25_100 } });
  });
});
