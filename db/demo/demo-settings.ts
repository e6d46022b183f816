import { demoId } from './demo-id';
import type { DemoWriter } from './demo-writer';
import type { SettingKey } from './trial-truth';

export const settingIdOf = (key: SettingKey) => demoId(`quillfern/setting/${key}`);

const settings: { key: SettingKey; body: Record<string, unknown> }[] = [
  {
    key: 'raised',
    body: { name: 'Raised', phrase: 'the cleaners raised', cleaner: 'floating', pressureDirection: 'lift', pressure: { typed: '60 lbf' }, workingDepth: null, note: 'Out of the soil and the residue; the reference.' },
  },
  {
    key: 'pinned',
    body: { name: 'Pinned above the soil', phrase: 'the cleaners pinned above the soil', cleaner: 'fixed', pressureDirection: null, pressure: null, workingDepth: { typed: '0' }, note: 'Held just above the ground; high spots are touched.' },
  },
  {
    key: 'own-weight',
    body: { name: 'Floating, own weight', phrase: 'the cleaners floating on their own weight', cleaner: 'floating', pressureDirection: 'own-weight', pressure: null, workingDepth: { typed: '1/2' }, note: null },
  },
  {
    key: 'light-down',
    body: { name: 'Floating, light down', phrase: 'the cleaners floating, light down', cleaner: 'floating', pressureDirection: 'down', pressure: { typed: '25 lbf' }, workingDepth: { typed: '3/4' }, note: null },
  },
];

/** The four settings of the trial, all changed from the cab, so that strips could be drawn by chance. */
export async function writeSettings(write: DemoWriter): Promise<void> {
  for (const { key, body } of settings) {
    await write({ kind: 'setting.add', thingId: settingIdOf(key), body: { wheels: 'toothed', adjustedFrom: 'cab', ...body }, by: 'agronomist', on: '2026-03-12' });
  }
}
