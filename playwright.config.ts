import { existsSync } from 'node:fs';
import { defineConfig } from '@playwright/test';
import { CHROMIUM_ARGS } from './e2e/support/chromium.ts';
import { testPort } from './server/local/places.mjs';

const url = `http://127.0.0.1:${testPort}`;
const chromium = process.env.CHROMIUM ?? '/usr/bin/chromium';

/**
 * `*.spec.ts` runs at desktop size, `*.phone.spec.ts` with touch at a phone's,
 * `*.serial.spec.ts` one after the other, each with a server of its own that it may kill; they take
 * longest, so they come first.
 */
export default defineConfig({
  testDir: 'e2e',
  outputDir: 'test-results',
  fullyParallel: true,
  forbidOnly: true,
  workers: 2,
  retries: 0,
  timeout: 45_000,
  expect: { timeout: 7_000 },
  reporter: [['list']],
  use: {
    baseURL: url,
    serviceWorkers: 'block',
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    // A quarter of all work would be the recording: `npx playwright test --trace on` asks for it.
    trace: 'off',
    // Where motion matters a test asks for it (`MOVING`): the rest is as quick without.
    contextOptions: { reducedMotion: 'reduce' },
    launchOptions: {
      ...(existsSync(chromium) ? { executablePath: chromium } : {}),
      args: CHROMIUM_ARGS,
    },
  },
  projects: [
    {
      name: 'serial',
      testMatch: /\.serial\.spec\.ts$/,
      fullyParallel: false,
      workers: 1,
      timeout: 120_000,
      use: { viewport: { width: 1440, height: 900 } },
    },
    {
      name: 'desktop',
      testIgnore: /\.(phone|serial)\.spec\.ts$/,
      use: { viewport: { width: 1440, height: 900 } },
    },
    {
      name: 'phone',
      testMatch: /\.phone\.spec\.ts$/,
      use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true },
    },
  ],
  webServer: {
    command: 'exec node server/local/testServer.mjs',
    url: `${url}/api/health`,
    timeout: 180_000,
    reuseExistingServer: false,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 20_000 },
    stdout: 'ignore',
    stderr: 'pipe',
  },
});
