import { defineConfig } from 'vitest/config';

// Vitest reads its settings from a default export only.
export default defineConfig({
  test: {
    environment: 'node',
    include: ['e2e/**/*.e2e.ts'],
    // Each file starts a shop and a browser of its own; two at once starve each other on a small machine.
    fileParallelism: false,
    testTimeout: 300_000,
    hookTimeout: 120_000,
  },
});
