import { availableParallelism } from 'node:os';
import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));

export default defineConfig({
  root,
  plugins: [react(), tailwindcss()],
  publicDir: 'src/public',
  build: {
    outDir: process.env.BARMKIN_DIST ?? 'dist',
    emptyOutDir: true,
    assetsDir: 'assets',
    // Small files stay files: the content policy allows no data: fonts or scripts.
    assetsInlineLimit: 0,
    // The bench reads from it which files the entry imports, and how heavy they are.
    manifest: true,
  },
  test: {
    maxWorkers: Math.min(2, availableParallelism()),
    // `include` stands only inside the projects: a shared one would be merged into each.
    projects: [
      { extends: true, test: { name: 'unit', include: ['tests/unit/**/*.test.{ts,tsx}'] } },
      { extends: true, test: { name: 'published', include: ['tests/published/**/*.test.ts'] } },
      {
        extends: true,
        test: { name: 'property', include: ['tests/property/**/*.test.ts'], testTimeout: 60_000 },
      },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/support/globalSetup.ts'],
          pool: 'forks',
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
