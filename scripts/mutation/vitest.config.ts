import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

// The tests that pin values of the core. Properties and simulations are left out: they are slow, and a mutant that only
// they notice is one that no pinned value holds.
export default defineConfig({
  root,
  resolve: { alias: { '@': root } },
  test: {
    include: ['tests/unit/agronomy/**/*.test.ts', 'tests/unit/agronomy-inference/**/*.test.ts'],
    exclude: ['**/*.property.test.ts', '**/*.simulation.test.ts'],
    environment: 'node',
    testTimeout: 240_000,
  },
});
