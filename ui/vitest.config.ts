import react from '@vitejs/plugin-react';
import { configDefaults, defineConfig } from 'vitest/config';
import { alias } from './vite.config.ts';

// Vitest reads its settings from a default export only.
export default defineConfig({
  plugins: [react()],
  resolve: { alias },
  test: {
    environment: 'jsdom',
    setupFiles: ['./src/testing/setup.ts'],
    exclude: [...configDefaults.exclude, 'e2e/**'],
    css: false,
    testTimeout: 20_000,
    restoreMocks: true,
  },
});
