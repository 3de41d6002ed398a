import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import type { Part, Row } from './row.ts';

interface Chunk {
  readonly file: string;
  readonly imports?: readonly string[];
}
type Manifest = Readonly<Record<string, Chunk>>;

const PUBLIC = [
  'welcome/WelcomePage',
  'sign-in/SignInPage',
  'sign-up/SignUpPage',
  'join/JoinPage',
  'checks/ChecksPage',
];
/** Open to anybody too, but they judge a chain, and so bring the engine along. */
const JUDGING = ['shared/SharedPage', 'guest/GuestPage', 'science/AboutSciencePage'];
const BOARD = ['board/BoardPage'];

/** How much JavaScript a page needs before it stands there. */
export const pages: Part = {
  name: 'pages',
  run: async () => {
    const dist = process.env.BARMKIN_DIST ?? 'dist';
    const manifest = JSON.parse(
      readFileSync(join(dist, '.vite/manifest.json'), 'utf8'),
    ) as Manifest;
    return [
      row('JavaScript of the public pages', 155, heaviest(dist, manifest, PUBLIC)),
      row('JavaScript of the public pages that judge', 155, heaviest(dist, manifest, JUDGING)),
      row('JavaScript of the signed-in board', 260, heaviest(dist, manifest, BOARD)),
    ];
  },
};

function row(what: string, most: number, bytes: number): Row {
  const kb = bytes / 1000;
  return {
    what,
    reach: `≤ ${most} kB gzip`,
    measured: `${kb.toFixed(0)} kB gzip`,
    holds: kb <= most,
  };
}

/** The heaviest of some pages: the entry, the shell and the page, each with all that they import at once. */
function heaviest(dist: string, manifest: Manifest, routes: readonly string[]): number {
  if (routes === BOARD && manifest['src/routes/board/BoardPage.tsx'] === undefined) {
    throw new Error('The board is no page of its own any more: measure it anew.');
  }
  const sizes = routes.map((route) => {
    const key = `src/routes/${route}.tsx`;
    const starts = route.startsWith('board/')
      ? ['index.html', 'src/routes/shell/Shell.tsx', key]
      : ['index.html', key];
    const files = new Set(starts.flatMap((start) => [...graph(manifest, start)]));
    return [...files].reduce(
      (sum, file) => sum + gzipSync(readFileSync(join(dist, file))).length,
      0,
    );
  });
  return Math.max(...sizes);
}

/** The files that a chunk brings along; none where it is part of the entry. */
function graph(manifest: Manifest, start: string, seen = new Set<string>()): Set<string> {
  const chunk = manifest[start];
  if (chunk === undefined || seen.has(chunk.file)) return seen;
  seen.add(chunk.file);
  for (const next of chunk.imports ?? []) graph(manifest, next, seen);
  return seen;
}
