import react from '@vitejs/plugin-react';
import { defaultClientConditions, defaultServerConditions } from 'vite';
import { defineConfig } from 'vitest/config';

const api = process.env.API_URL ?? 'http://127.0.0.1:4781';

// Specs in plain TypeScript that stand on a browser's storage or its requests.
const needsBrowser = ['src/api-client/**/*.test.ts'];

// Puts back what specs change in modules that all files of a process share.
const MODULES = './src/testing/modules.ts';

export default defineConfig({
  plugins: [react()],
  // The levels package is read from its TypeScript source, so the browser never waits for a server build.
  resolve: { conditions: ['@ferrite-row/source', ...defaultClientConditions] },
  // So do the specs that run in Node.
  ssr: { resolve: { conditions: ['@ferrite-row/source', ...defaultServerConditions] } },
  server: { host: '127.0.0.1', port: 4782, proxy: { '/api': api } },
  preview: { host: '127.0.0.1', proxy: { '/api': api } },
  build: { assetsDir: 'assets', chunkSizeWarningLimit: 600 },
  test: {
    globals: true,
    css: false,
    testTimeout: 30_000,
    unstubGlobals: true,
    // Left to itself Vitest keeps one core free.
    maxWorkers: '100%',
    projects: [
      {
        extends: true,
        test: {
          name: 'reckoning',
          include: ['src/**/*.test.ts'],
          exclude: needsBrowser,
          environment: 'node',
          isolate: false,
          setupFiles: MODULES,
        },
      },
      {
        extends: true,
        test: {
          name: 'pages',
          include: ['src/**/*.test.tsx', ...needsBrowser],
          environment: 'jsdom',
          // React, MUI and jsdom are loaded and warmed up once in each process instead of once in each file.
          isolate: false,
          environmentOptions: { jsdom: { url: 'http://127.0.0.1:4782/' } },
          setupFiles: [MODULES, './src/testing/setup.ts'],
        },
      },
    ],
  },
});
