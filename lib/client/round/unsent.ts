import { roundStoreName, RoundStore } from './round-store';

/** Whether field work waits on this device that has not been sent, whoever's it is. Makes no store where there is none. */
export async function hasUnsent(): Promise<boolean> {
  try {
    const known = (await indexedDB.databases?.()) ?? [];
    if (!known.some(({ name }) => name === roundStoreName)) return false;
    const store = new RoundStore();
    await store.open();
    const waiting = (await store.entries.filter((entry) => entry.state !== 'sent').count()) + (await store.photos.count());
    store.close();
    return waiting > 0;
  } catch {
    return false;
  }
}
