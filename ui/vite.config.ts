import react from '@vitejs/plugin-react';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vite';

/** Folder of a path relative to this file. */
export const pathTo = (path: string) => fileURLToPath(new URL(path, import.meta.url));

/** Names that stand for folders in imports; the tests use the same ones. */
export const alias = { '@': pathTo('./src'), '@engine': pathTo('../service/src/engine') };

const api = `http://127.0.0.1:${process.env.API_PORT ?? 3000}`;

// Vite reads its settings from a default export only.
export default defineConfig({
  plugins: [react()],
  resolve: { alias },
  server: { port: Number(process.env.UI_PORT ?? 5173), proxy: { '/api': api } },
  build: { outDir: 'dist', emptyOutDir: true, manifest: true, chunkSizeWarningLimit: 600 },
});
