import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: { alias: { '@': fileURLToPath(new URL('.', import.meta.url)) } },
  test: {
    include: [
      '{lib,db,server,components,app}/**/*.test.{ts,tsx}',
      'tests/{published,unit}/**/*.test.ts',
    ],
    environment: 'node',
    pool: 'forks',
    maxWorkers: 2,
    testTimeout: 30_000,
    hookTimeout: 60_000,
    // A shared machine can stall for seconds; a test that fails twice has failed.
    retry: process.env.CI ? 1 : 0,
  },
});
