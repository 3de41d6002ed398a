import { availableParallelism } from 'node:os';
import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));

/** The toasts bring their styles as an inline one, which the content policy forbids: a file takes its place. */
const toastStylesAsFile: Plugin = {
  name: 'toast-styles-as-file',
  transform: {
    filter: { id: /node_modules\/sonner\/dist\/index\.mjs/ },
    handler(code) {
      const without = code.replace(/^__insertCSS\(.*\);?$/m, '');
      if (without === code)
        throw new Error('sonner no longer inserts its styles: see what it does');
      return { code: `import 'sonner/dist/styles.css';\n${without}`, map: null };
    },
  },
};

/** The contracts bring a maker of JSON schemas along, 16 kB that no page has a use for: it stays on the server. */
const noJsonSchemas: Plugin = {
  name: 'no-json-schemas',
  apply: 'build',
  transform: {
    filter: { id: /node_modules\/zod\/v4\/core\/(json-schema-processors|to-json-schema)\.js$/ },
    handler(code) {
      const names = [...code.matchAll(/^export (?:const|function|class) (\w+)/gm)].map(
        ([, name]) => `export const ${name} = () => none;`,
      );
      if (names.length === 0) throw new Error('zod keeps its JSON schemas elsewhere: see where');
      const none = `const none = () => { throw new Error('Pages make no JSON schemas'); };`;
      return { code: [none, ...names].join('\n'), map: null };
    },
  },
};

/**
 * The service worker: keeps the pages themselves, never an answer of the API, so that they open
 * without a connection. It waits until it is told to take over. Addresses that carry a token are
 * left to the server, which forbids keeping them.
 */
const serviceWorker = VitePWA({
  strategies: 'generateSW',
  filename: 'sw.js',
  registerType: 'prompt',
  // The shell registers it, once somebody is signed in: a visitor need not load every page.
  injectRegister: null,
  // A file of its own, in `src/public`.
  manifest: false,
  workbox: {
    inlineWorkboxRuntime: true,
    // Of the fonts only the letters that the pages use; the picture of the README stays out.
    globPatterns: [
      'index.html',
      '*.{svg,webmanifest}',
      'theme.js',
      'icon-192.png',
      'assets/*.{js,css}',
      'assets/*-latin-wght-normal-*.woff2',
    ],
    navigateFallback: '/index.html',
    navigateFallbackDenylist: [/^\/(api|shared|guest|join)\//],
    cleanupOutdatedCaches: true,
  },
});

export default defineConfig({
  root,
  plugins: [react(), tailwindcss(), toastStylesAsFile, noJsonSchemas, serviceWorker],
  // In development it would be bundled beforehand, past the plugin.
  optimizeDeps: { exclude: ['sonner'] },
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
