import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: { include: ['test/**/*.test.mjs'], testTimeout: 90_000, hookTimeout: 90_000 },
});
