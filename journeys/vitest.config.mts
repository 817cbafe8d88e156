import { defaultServerConditions } from 'vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: { conditions: ['@fairlead/source', ...defaultServerConditions] },
  ssr: { resolve: { conditions: ['@fairlead/source', ...defaultServerConditions] } },
  test: {
    include: ['*.journey.ts'],
    globalSetup: ['harness/global-setup.mjs'],
    testTimeout: 60_000,
    hookTimeout: 60_000,
    maxWorkers: 2,
  },
});
