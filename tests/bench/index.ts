import { cpus, loadavg } from 'node:os';
import { batchPage } from './batchPage.ts';
import { board } from './board.ts';
import { breweries } from './breweries.ts';
import { cooling } from './cooling.ts';
import { drag } from './drag.ts';
import { engine } from './engine.ts';
import { live } from './live.ts';
import { moves } from './moves.ts';
import { pages } from './pages.ts';
import { streams } from './streams.ts';
import type { Part, Row } from './row.ts';

/** Each part of the bench; one may be asked for by name. */
const PARTS: readonly Part[] = [
  engine,
  cooling,
  board,
  breweries,
  moves,
  pages,
  drag,
  batchPage,
  live,
  streams,
];

async function main(names: readonly string[]): Promise<void> {
  const unknown = names.filter((name) => !PARTS.some((part) => part.name === name));
  if (unknown.length > 0) throw new Error(`There is no part ${unknown.join(', ')}.`);
  // What else the machine has to do: above about 1.5 the figures say more of that than of Barmkin.
  const load = loadavg()[0] ?? 0;
  const rows: Row[] = [];
  for (const part of PARTS)
    if (names.length === 0 || names.includes(part.name)) rows.push(...(await part.run()));
  console.log(
    `${cpus().length} × ${cpus()[0]?.model ?? 'processor'}, Node ${process.version}, load ${load.toFixed(1)}\n`,
  );
  console.log(table(rows));
  if (rows.some((row) => !row.holds)) process.exitCode = 1;
}

function table(rows: readonly Row[]): string {
  const lines = [
    ['what', 'reach', 'measured', 'holds'],
    ['---', '---', '---', '---'],
    ...rows.map((row) => [row.what, row.reach, row.measured, row.holds ? 'yes' : 'no']),
  ];
  return lines.map((cells) => `| ${cells.join(' | ')} |`).join('\n');
}

await main(process.argv.slice(2));
