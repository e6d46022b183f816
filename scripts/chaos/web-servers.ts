import { closeSync, openSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { anyFreePort } from '../port.mjs';
import { startWebServer } from '../web-server.mjs';

export type Server = { address: string; kills: () => number; kill: () => void; stop: () => Promise<void> };
type Plan = { env: Record<string, string>; logFile: string; broken: string | null };

/**
 * One real server of the production build on loopback (or the broken one of a control) that can be killed outright. It is
 * started again on its own port, as whatever runs servers would do.
 */
export async function standingServer({ env, logFile, broken }: Plan): Promise<Server> {
  const port = await anyFreePort();
  const log = openSync(logFile, 'w', 0o600);
  const program = broken === null ? undefined : ['--conditions=react-server', '--import', 'tsx', 'scripts/chaos/broken-server.ts', broken, String(port)];
  const start = () => startWebServer({ host: '127.0.0.1', port, env, stdio: ['ignore', log, log] as never, program });
  let running = await start();
  let up = true;
  let leaving = false;
  let kills = 0;
  const watch = () =>
    void running.over.then(async () => {
      up = false;
      while (!leaving) {
        try {
          running = await start();
          up = true;
          return watch();
        } catch {
          // The database may be away at this moment; then it is tried again.
          await pause(500);
        }
      }
    });
  watch();
  return {
    address: running.address,
    kills: () => kills,
    kill: () => {
      if (!up) return;
      up = false;
      kills += 1;
      void running.kill();
    },
    stop: async () => {
      leaving = true;
      await running.stop();
      closeSync(log);
    },
  };
}
