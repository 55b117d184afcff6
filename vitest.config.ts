import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export default defineConfig({
  resolve: { alias: { 'server-only': at('./tests/support/empty.ts'), '@': at('.') } },
  test: {
    include: ['tests/**/*.test.ts', 'tests/**/*.test.tsx'],
    globalSetup: ['./tests/support/global-setup.ts'],
    // An awkward zone, so that a date that leans on the machine's zone shows itself.
    env: { TZ: 'America/Los_Angeles', LOG_LEVEL: 'silent' },
    pool: 'forks',
    maxWorkers: 2,
    testTimeout: 60_000,
    hookTimeout: 120_000,
  },
});
