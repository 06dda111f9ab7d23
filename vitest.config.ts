import { existsSync } from 'node:fs';
import { join } from 'node:path';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const database = join(import.meta.dirname, 'tests/setup/database.ts');

// A PGlite database takes about 800 MB while it is made: few workers, one migrated copy for all (tests/setup/database.ts).
export default defineConfig({
  test: {
    maxWorkers: 2,
    projects: [
      { test: { name: 'shared', environment: 'node', include: ['tests/shared/**/*.test.ts'], testTimeout: 60_000 } },
      {
        test: {
          name: 'server',
          environment: 'node',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: existsSync(database) ? [database] : [],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        plugins: [react()],
        test: { name: 'src', environment: 'jsdom', include: ['tests/src/**/*.test.{ts,tsx}'], testTimeout: 15_000 },
      },
      {
        test: {
          name: 'architecture',
          environment: 'node',
          include: ['tests/architecture/**/*.test.ts'],
          testTimeout: 60_000,
        },
      },
    ],
  },
});
