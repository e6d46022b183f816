import { setTimeout as pause } from 'node:timers/promises';
import type { Chance } from './chance';

export type Target = { name: string; strike: () => void; betweenMs: readonly [number, number] };

/** Strikes each target again and again at times drawn within its bounds, until it is over; answers with how often. */
export async function strikeUntil(over: () => boolean, targets: readonly Target[], chance: Chance): Promise<Record<string, number>> {
  const struck: Record<string, number> = {};
  await Promise.all(
    targets.map(async ({ name, strike, betweenMs }) => {
      const own = chance.branch();
      struck[name] = 0;
      for (;;) {
        const until = performance.now() + own.whole(...betweenMs);
        while (performance.now() < until && !over()) await pause(50);
        if (over()) return;
        strike();
        struck[name] = (struck[name] ?? 0) + 1;
      }
    }),
  );
  return struck;
}
