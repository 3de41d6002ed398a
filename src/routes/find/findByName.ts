import type { BoardIndex } from '#shared/chain/board.ts';

export interface Found {
  id: string;
  kind: 'batch' | 'chain';
  name: string;
  /** Where it stands. */
  where: string;
}

/** Everything on a board that has a name of its own, in the board's order. */
export function namedOn(index: BoardIndex): Found[] {
  const shelves = index.chains.map(({ id, name }): Found => ({
    id,
    kind: 'chain',
    name,
    where: 'shelf',
  }));
  const shelved = index.chains.flatMap((chain) =>
    index
      .batchesOf(chain.id)
      .map(({ id, name }): Found => ({ id, kind: 'batch', name, where: `on ${chain.name}` })),
  );
  const bench = index.bench.map(({ id, name }): Found => ({
    id,
    kind: 'batch',
    name,
    where: 'on the bench',
  }));
  return [...shelves, ...shelved, ...bench];
}

/** Small letters without marks: "Kölsch" is found by "kolsch". */
const plain = (text: string) =>
  text.normalize('NFD').replace(/\p{M}/gu, '').toLocaleLowerCase('en-GB').trim();

/** 0: the name begins so; 1: a word of it does; 2: it has it somewhere; null: not at all. */
function rank(name: string, asked: string): number | null {
  const at = name.indexOf(asked);
  if (at < 0) return null;
  if (at === 0) return 0;
  return name.includes(` ${asked}`) ? 1 : 2;
}

/** What has the text in its name, the likeliest first; nothing typed finds all. */
export function findByName(all: readonly Found[], text: string): Found[] {
  const asked = plain(text);
  return all
    .flatMap((found) => {
      const place = rank(plain(found.name), asked);
      return place === null ? [] : [{ found, place }];
    })
    .toSorted((a, b) => a.place - b.place)
    .map(({ found }) => found);
}
