import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    include: ['src/**/*.test.ts', 'test/**/*.test.ts'],
    testTimeout: process.env.FAIRLEAD_LONG === '1' ? 600_000 : 60_000,
  },
});
