import react from '@vitejs/plugin-react';
import { defaultClientConditions } from 'vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [react()],
  resolve: { conditions: ['@fairlead/source', ...defaultClientConditions] },
  ssr: { resolve: { conditions: ['@fairlead/source', ...defaultClientConditions] } },
  test: {
    environment: 'happy-dom',
    include: ['src/**/*.test.{ts,tsx}'],
    setupFiles: ['src/test/setup.ts'],
    // A property of the long run takes its ten thousand turns on a busy machine.
    testTimeout: process.env.FAIRLEAD_LONG === '1' ? 600_000 : 20_000,
    css: { include: [/\?raw$/] },
    environmentOptions: { happyDOM: { url: 'http://127.0.0.1:4600/' } },
  },
});
