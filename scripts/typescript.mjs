// Runs the project's own TypeScript programs outside the web server.
import { checkout } from './places.mjs';
import { run } from './run.mjs';

/** The environment of whoever started this, without what only npm or another database needs. */
export function plainEnvironment() {
  const unwanted =
    /^(npm_|PG|TEST_|ROWRISE_)|^(DATABASE_URL|MIGRATION_DATABASE_URL|ERASER_DATABASE_URL|NODE_ENV|INIT_CWD)$/;
  const entries = Object.entries(process.env).filter(([name]) => !unwanted.test(name));
  return { ...Object.fromEntries(entries), NEXT_TELEMETRY_DISABLED: '1' };
}

/** Under the react-server condition the marker package for server-only files lets a plain program import them. */
export function runScript(script, args, { env, ...options }) {
  return run(process.execPath, ['--conditions=react-server', '--import', 'tsx', script, ...args], {
    cwd: checkout,
    env: { ...plainEnvironment(), ...env },
    ...options,
  });
}
