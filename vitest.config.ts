import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));

export default defineConfig({
  resolve: {
    alias: [
      { find: /^@\//, replacement: root },
      // `server-only` throws outside a React server build; tests of server code load an empty module instead.
      { find: 'server-only', replacement: `${root}tests/helpers/empty-module.ts` },
    ],
  },
  test: {
    include: ['tests/**/*.test.ts'],
    testTimeout: 20_000,
  },
});
