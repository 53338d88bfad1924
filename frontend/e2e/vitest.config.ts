import { defineConfig } from 'vitest/config';

export default defineConfig({
  root: import.meta.dirname,
  test: {
    include: ['**/*.test.ts'],
    fileParallelism: false,
    // A journey crosses a browser, a server and a database; the closing summary tells which needed their second try.
    retry: 1,
    testTimeout: 120_000,
    hookTimeout: 60_000,
    // A busy machine takes longer than the usual second to answer and draw.
    expect: { poll: { timeout: 15_000 } },
  },
});
