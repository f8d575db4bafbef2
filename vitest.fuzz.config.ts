import { defineConfig } from 'vitest/config';
import base from './vitest.config';

const MINUTE = 60_000;

/**
 * `RUNS=20000 npm run fuzz [-- FILTER]`: the long sweeps under tests/fuzz. RUNS is the number of cases a property gets; the
 * seed of each is printed when it fails.
 */
export default defineConfig({
  ...base,
  test: {
    ...base.test,
    include: ['tests/fuzz/**/*.fuzz.ts'],
    setupFiles: ['tests/fuzz/run-count.ts'],
    testTimeout: 60 * MINUTE,
    hookTimeout: MINUTE,
    fileParallelism: false,
  },
});
