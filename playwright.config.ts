import { defineConfig } from '@playwright/test';

// `npm test` starts the servers and says where they are. By hand: ROWRISE_URL=http://127.0.0.1:3000 npx playwright test
export default defineConfig({
  testDir: './tests/e2e',
  outputDir: './test-results',
  forbidOnly: true,
  retries: 0,
  workers: 2,
  // A walk that opens many pages takes a minute on two busy cores.
  timeout: 180_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL: process.env.ROWRISE_URL,
    trace: 'off',
    locale: 'en-US',
    timezoneId: 'America/Chicago',
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      // The tests visit our own pages on loopback; the browser itself must reach for nothing else. Containers give
      // /dev/shm too little room.
      args: [
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-dev-shm-usage',
        '--disable-sync',
        '--no-first-run',
      ],
    },
  },
  projects: [
    {
      name: 'phone',
      use: { viewport: { width: 390, height: 844 }, hasTouch: true },
      // The first owner comes in once, and who may do what does not depend on the screen.
      testIgnore: ['new-owner.spec.ts', 'access.spec.ts'],
    },
    { name: 'desk', use: { viewport: { width: 1440, height: 900 } } },
  ],
});
