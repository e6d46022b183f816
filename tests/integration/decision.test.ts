import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { contentHash } from '@/lib/server/operations/content-hash';
import { makeDecideScenes, purdueInputs, type DecideScene } from '../support/decide-scene';

let scene: DecideScene;
let other: DecideScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  [scene, other] = made.scenes as [DecideScene, DecideScene];
  close = made.close;
});
afterAll(() => close());

async function awaiting() {
  const planting = await scene.plant();
  const rows = await scene.count(planting, [19, 21, 20, 20]);
  await scene.save('grower', planting, purdueInputs);
  return { planting, rows, basisHash: (await scene.read('grower', planting)).basisHash };
}

describe('signing a decision', () => {
  it('freezes what stood on the screen, and keeps it when a count comes later', async () => {
    const { planting, rows, basisHash } = await awaiting();
    expect((await scene.sign('grower', planting, basisHash)).outcome).toBe('applied');
    const before = (await scene.read('grower', planting)).decisions;
    expect(before).toHaveLength(1);
    expect(before[0]).toMatchObject({
      decided: 'keep',
      recommended: 'keep',
      signedName: 'Test Grower',
      personName: 'Test grower',
      signedOn: '2026-05-20',
    });
    expect(contentHash(before[0]?.basis)).toBe(basisHash);
    await scene.countAgain(rows[0] ?? '', 25, '2026-05-19');
    const after = await scene.read('grower', planting);
    expect(after.decisions).toEqual(before);
    expect(after.basisHash).not.toBe(basisHash);
    expect(after.decisions[0]?.basis.stand?.plantsPerAcre).toBeCloseTo(20_000, 6);
    expect(after.basis.stand?.plantsPerAcre).toBeCloseTo(21_500, 6);
    expect(after.decisions[0]?.basis.countedRows.flatMap(({ countIds }) => countIds)).toHaveLength(4);
  });

  it('signs nothing when figures or counts moved between reading and signing', async () => {
    const { planting, rows, basisHash } = await awaiting();
    await scene.save('agronomist', planting, { ...purdueInputs, pricePerBushel: '4.10' });
    expect(await scene.sign('grower', planting, basisHash)).toMatchObject({
      outcome: 'refused',
      code: 'basis-changed',
    });
    const { basisHash: next } = await scene.read('grower', planting);
    await scene.countAgain(rows[0] ?? '', 20, '2026-05-19');
    expect((await scene.sign('grower', planting, next)).code).toBe('basis-changed');
    expect((await scene.read('grower', planting)).decisions).toEqual([]);
  });

  it('gives the same basis, and the same hash, to whoever reads', async () => {
    const { planting, basisHash } = await awaiting();
    expect((await scene.read('owner', planting)).basisHash).toBe(basisHash);
    expect((await scene.read('agronomist', planting)).basisHash).toBe(basisHash);
  });

  it('is signed once on the same numbers; another choice is a new decision', async () => {
    const { planting, basisHash } = await awaiting();
    const twins = await Promise.all([
      scene.sign('grower', planting, basisHash),
      scene.sign('owner', planting, basisHash),
    ]);
    expect(twins.map(({ outcome }) => outcome).sort()).toEqual(['applied', 'refused']);
    expect(twins.find(({ outcome }) => outcome === 'refused')).toMatchObject({ code: 'already-there' });
    expect((await scene.sign('grower', planting, basisHash, { decided: 'replant' })).outcome).toBe('applied');
    const { decisions } = await scene.read('grower', planting);
    expect(decisions.map(({ decided }) => decided).sort()).toEqual(['keep', 'replant']);
  });

  it('answers the very same operation as it did before', async () => {
    const { planting, basisHash } = await awaiting();
    const id = v7();
    const again = { operationId: v7(), deviceSequence: 1 };
    const body = {
      plantingId: planting,
      zoneId: null,
      decided: 'keep',
      signedName: 'Test Grower',
      basisHash,
    };
    expect((await scene.send('grower', 'decision.sign', id, body, again)).outcome).toBe('applied');
    expect((await scene.send('grower', 'decision.sign', id, body, again)).outcome).toBe('duplicate');
    expect((await scene.read('grower', planting)).decisions).toHaveLength(1);
  });

  it('is left to the grower of the farm and the owner', async () => {
    const { planting, basisHash } = await awaiting();
    expect((await scene.sign('agronomist', planting, basisHash)).code).toBe('forbidden');
    expect((await scene.sign('scout', planting, basisHash)).code).toBe('forbidden');
    expect((await scene.sign('neighbor', planting, basisHash)).code).toBe('not-found');
    expect((await other.sign('owner', planting, basisHash)).code).toBe('not-found');
    expect((await scene.sign('owner', planting, basisHash)).outcome).toBe('applied');
  });

  it('wants a name, a known choice and an answer to sign', async () => {
    const { planting, basisHash } = await awaiting();
    expect((await scene.sign('grower', planting, basisHash, { signedName: '  ' })).fields).toEqual([
      { path: 'signedName', message: 'Type your name to sign.' },
    ]);
    expect((await scene.sign('grower', planting, basisHash, { decided: 'hoe' })).fields?.[0]?.path).toBe(
      'decided',
    );
    const bare = await scene.plant();
    const { basisHash: nothing } = await scene.read('grower', bare);
    expect((await scene.sign('grower', bare, nothing)).code).toBe('bad-input');
  });

  it('signs a bounded answer that the table leaves open', async () => {
    const planting = await scene.plant();
    await scene.count(planting, [8, 8, 8]);
    await scene.save('grower', planting, {
      ...purdueInputs,
      costs: [{ label: 'All', dollarsPerAcre: '200' }],
    });
    const { basisHash } = await scene.read('grower', planting);
    expect((await scene.sign('grower', planting, basisHash)).outcome).toBe('applied');
    expect((await scene.read('grower', planting)).decisions[0]?.recommended).toBe('cannot-tell');
  });
});
