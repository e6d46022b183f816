import { layout } from '@/lib/agronomy/layout';
import { badField } from '@/lib/errors/app-error';
import type { LayOutTrialInput } from '@/lib/schemas/trial';

/** Draws the layout again from its seed; one that differs was not drawn by chance, and no test could rest on it. */
export function assertDrawn(body: LayOutTrialInput): void {
  if (new Set(body.settingIds).size !== body.settingIds.length) throw badField('settingIds', 'Name each setting once.');
  if (!body.settingIds.includes(body.referenceSettingId)) {
    throw badField('referenceSettingId', 'The reference is one of the settings that are compared.');
  }
  if ((body.layout === 'pairs') !== (body.settingIds.length === 2)) {
    throw badField('layout', 'Pairs compare two settings; with three or more, complete blocks do.');
  }
  const drawn = layout({ settings: body.settingIds, blocks: body.blocks.length, seed: body.randomSeed });
  const agrees = drawn.blocks.every((block, index) =>
    block.strips.every((strip, place) => body.blocks[index]?.strips[place]?.settingId === strip.setting),
  );
  const complete = body.blocks.every((block) => block.strips.length === body.settingIds.length);
  if (!agrees || !complete) throw badField('blocks', 'This is not the layout that the seed draws. Draw it again.');
}
