import react from '@vitejs/plugin-react';
import { defaultClientConditions } from 'vite';
import { defineConfig } from 'vitest/config';

const api = process.env.API_URL ?? 'http://127.0.0.1:4781';

export default defineConfig({
  plugins: [react()],
  // The levels package is read from its TypeScript source, so the browser never waits for a server build.
  resolve: { conditions: ['@ferrite-row/source', ...defaultClientConditions] },
  server: { host: '127.0.0.1', port: 4782, proxy: { '/api': api } },
  preview: { host: '127.0.0.1', proxy: { '/api': api } },
  build: { assetsDir: 'assets', chunkSizeWarningLimit: 600 },
  test: {
    environment: 'jsdom',
    environmentOptions: { jsdom: { url: 'http://127.0.0.1:4782/' } },
    globals: true,
    css: false,
    testTimeout: 30_000,
    include: ['src/**/*.test.{ts,tsx}'],
    setupFiles: './src/testing/setup.ts',
  },
});
