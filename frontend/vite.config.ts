import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const common = fileURLToPath(new URL('../common/src', import.meta.url));

export default defineConfig({
  plugins: [react()],
  resolve: { alias: [{ find: /^@bellgap\/common\/(.*)$/, replacement: `${common}/$1/index.ts` }] },
  server: {
    host: '127.0.0.1',
    proxy: { '/api': { target: process.env.BACKEND_URL ?? 'http://127.0.0.1:3000', changeOrigin: false } },
  },
  build: {
    target: 'es2022',
    // Fonts written into the style sheet would be refused by the content security policy.
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 700,
  },
});
