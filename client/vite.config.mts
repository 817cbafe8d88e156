import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig } from 'vite';

export default defineConfig({
  plugins: [react()],
  resolve: { conditions: ['@fairlead/source', ...defaultClientConditions] },
  server: {
    host: '127.0.0.1',
    port: Number(process.env.FAIRLEAD_CLIENT_PORT ?? 4600),
    strictPort: true,
    proxy: { '/api': process.env.FAIRLEAD_API ?? 'http://127.0.0.1:4601' },
  },
  build: {
    manifest: true,
    // The content security policy loads fonts and pictures as files only.
    assetsInlineLimit: 0,
    sourcemap: false,
    target: 'es2022',
    rolldownOptions: {
      // shared is pure: a page loads only the modules it uses, although all come through one door.
      treeshake: { moduleSideEffects: (id) => !/[\\/]shared[\\/]src[\\/]/.test(id) },
    },
  },
});
