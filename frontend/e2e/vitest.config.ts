import { defineConfig } from 'vitest/config';

export default defineConfig({
  root: import.meta.dirname,
  test: {
    include: ['**/*.test.ts'],
    fileParallelism: false,
    testTimeout: 120_000,
    hookTimeout: 60_000,
    // A busy machine takes longer than the usual second to answer and draw.
    expect: { poll: { timeout: 15_000 } },
  },
});
