import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('..', import.meta.url));
const setupFiles = ['tests/silence.ts'];

export default defineConfig({
  test: {
    root,
    projects: [
      {
        root,
        test: {
          name: 'core',
          setupFiles,
          include: ['tests/**/*.test.{ts,tsx}'],
          exclude: ['tests/browser/**'],
          testTimeout: 30_000,
        },
      },
      {
        root,
        test: {
          name: 'browser',
          setupFiles,
          include: ['tests/browser/**/*.test.ts'],
          testTimeout: 90_000,
          hookTimeout: 90_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
