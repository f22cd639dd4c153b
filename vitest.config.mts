import { defineConfig } from 'vitest/config';

const resolve = {
  tsconfigPaths: true,
  // `server-only` throws outside a React server build; in tests it has nothing to guard.
  alias: { 'server-only': new URL('./tests/support/empty.ts', import.meta.url).pathname },
};

export default defineConfig({
  test: {
    projects: [
      {
        resolve,
        test: {
          name: 'node',
          include: ['tests/**/*.test.ts'],
          environment: 'node',
          testTimeout: 30_000,
        },
      },
      {
        resolve,
        test: {
          name: 'jsdom',
          include: ['tests/components/**/*.test.tsx'],
          environment: 'jsdom',
        },
      },
    ],
  },
});
