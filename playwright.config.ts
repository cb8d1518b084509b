import { defineConfig } from '@playwright/test';

/** Debian's Chromium without a GPU: software WebGL for the framed view, plain raster for the rest. */
const CHROMIUM_ARGS = [
  '--no-sandbox',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--use-gl=angle',
  '--use-angle=swiftshader',
  '--enable-unsafe-swiftshader',
  '--disable-gpu-compositing',
];

/** Run by `npm test` against a server with the demo seeded; E2E_BASE_URL says where. */
export default defineConfig({
  testDir: 'test/e2e',
  testMatch: '**/*.e2e.ts',
  outputDir: 'test-results/e2e',
  workers: 1,
  timeout: 120_000,
  expect: { timeout: 20_000 },
  reporter: [['line'], ['json']],
  use: {
    baseURL: process.env.E2E_BASE_URL,
    viewport: { width: 1440, height: 900 },
    trace: 'retain-on-failure',
    launchOptions: { executablePath: process.env.E2E_CHROMIUM ?? '/usr/bin/chromium', args: CHROMIUM_ARGS },
  },
});
