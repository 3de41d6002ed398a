import { describe, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import { UNSETTLED_LINK, type BoardFacts } from '#shared/chain/board.ts';
import { moveBatch, type MoveWish } from '#shared/chain/move.ts';
import { boardOf, idOf, makeBatch, makeChain } from '../../support/boards.ts';

const one = idOf('chain', 1);
const two = idOf('chain', 2);
const b = (number: number) => idOf('batch', number);
const on = (chainId: string, place: number, brewOn: string | null, own: Partial<Batch> = {}) => ({
  chainId,
  place,
  brewOn,
  ...own,
});

/** Shelf 1: 1, 2, 3 brewed every 14 days from 6 March; shelf 2: 4; the bench: 5. */
function season(own: Partial<Record<1 | 2 | 3 | 4 | 5, Partial<Batch>>> = {}): BoardFacts {
  return boardOf({
    chains: [makeChain(1), makeChain(2)],
    batches: [
      makeBatch(1, on(one, 0, '2027-03-06', own[1])),
      makeBatch(2, on(one, 1, '2027-03-20', own[2])),
      makeBatch(3, on(one, 2, '2027-04-03', own[3])),
      makeBatch(4, on(two, 0, '2027-03-13', own[4])),
      makeBatch(5, { ...own[5] }),
    ],
  });
}

const wish = (batch: number, own: Partial<MoveWish>): MoveWish => ({
  batchId: b(batch),
  toChainId: two,
  afterBatchId: null,
  expectedChainId: null,
  dates: 'pull',
  ...own,
});

function done(board: BoardFacts, asked: MoveWish) {
  const result = moveBatch(board, asked);
  if (!result.ok) throw new Error(`${result.why}: ${result.detail}`);
  const rows = new Map(result.batches.map((row) => [row.id, row]));
  return { ...result, row: (number: number) => rows.get(b(number)) };
}

describe('moving a batch', () => {
  it('brews it on the day the yeast before it is racked off, and pulls the next ones along', () => {
    const result = done(season(), wish(5, { toChainId: one, afterBatchId: b(1) }));
    expect(result.row(5)).toMatchObject({ chainId: one, place: 1, brewOn: '2027-03-20' });
    expect(result.row(2)).toMatchObject({ place: 2, brewOn: '2027-04-03' });
    expect(result.row(3)).toMatchObject({ place: 3, brewOn: '2027-04-17' });
    expect(result.row(1)).toBeUndefined();
    expect(result.shifted).toHaveLength(3);
    expect(result.what).toBe('Moved Sluice 5 after Ebb 1');
  });

  it('closes up the chain that it leaves', () => {
    const result = done(season(), wish(2, { afterBatchId: b(4), expectedChainId: one }));
    expect(result.row(2)).toMatchObject({ chainId: two, place: 1, brewOn: '2027-03-27' });
    expect(result.row(3)).toMatchObject({ place: 1, brewOn: '2027-03-20' });
  });

  it('gives the first on a shelf its own date, else the next free brew day', () => {
    const dated = season({ 5: { brewOn: '2027-05-01' } });
    expect(done(dated, wish(5, {})).row(5)?.brewOn).toBe('2027-05-01');
    // Today is Monday 1 March: Saturday 6 is taken by batch 1, Sunday 7 is free.
    expect(done(season(), wish(5, {})).row(5)?.brewOn).toBe('2027-03-07');
  });

  it('keeps every date where that is asked for', () => {
    const result = done(season(), wish(5, { toChainId: one, afterBatchId: b(1), dates: 'keep' }));
    expect(result.shifted).toEqual([]);
    expect(result.row(5)).toMatchObject({ place: 1, brewOn: null });
  });

  it('leaves batches alone whose yeast is taken when it was before', () => {
    const late = season({ 3: { brewOn: '2027-04-10' } });
    const result = done(late, wish(5, { afterBatchId: b(4) }));
    expect(result.batches.map((row) => row.id)).toEqual([b(5)]);
  });

  it('shifts a planned day of taking with its beer', () => {
    const cone = season({ 3: { link: { ...UNSETTLED_LINK, takenOn: '2027-03-30' } } });
    const result = done(cone, wish(5, { toChainId: one, afterBatchId: b(1) }));
    // Batch 2 shifts by 14 days, so its yeast is taken on 13 April, and 3 is brewed then.
    expect(result.row(3)).toMatchObject({ brewOn: '2027-04-13', link: { takenOn: '2027-04-13' } });
    expect(result.cleared).toEqual([]);
  });

  it('clears what belonged to a link that it breaks, and says so', () => {
    const kept = season({ 2: { link: { ...UNSETTLED_LINK, keepL: 0.4 } } });
    const result = done(kept, wish(5, { toChainId: one, afterBatchId: b(1) }));
    expect(result.row(2)?.link).toEqual(UNSETTLED_LINK);
    expect(result.cleared).toEqual([b(2)]);
  });

  it('pulls a chain that hangs on a shifted batch', () => {
    const board = season();
    const hanging = {
      ...board,
      chains: [makeChain(1), makeChain(2, { start: { kind: 'cake', batchId: b(2) } })],
    };
    const result = done(hanging, wish(5, { toChainId: one, afterBatchId: b(1) }));
    expect(result.row(2)?.brewOn).toBe('2027-04-03');
    expect(result.row(4)?.brewOn).toBe('2027-04-17');
  });

  it('makes a shelf at the end for a batch', () => {
    const { version: _, lineId: __, position: ___, ...newChain } = makeChain(9, { name: 'Third' });
    const result = done(season(), wish(3, { toChainId: 'new', expectedChainId: one, newChain }));
    expect(result.chains).toEqual([{ ...newChain, version: 1, lineId: newChain.id, position: 2 }]);
    expect(result.row(3)).toMatchObject({ chainId: newChain.id, place: 0, brewOn: '2027-04-03' });
  });

  it('puts a batch on the bench where it was asked to', () => {
    const result = done(
      season(),
      wish(3, { toChainId: 'bench', afterBatchId: b(5), expectedChainId: one }),
    );
    expect(result.row(3)).toMatchObject({ chainId: null, place: 1, brewOn: '2027-04-03' });
    expect(result.row(5)).toBeUndefined();
  });
});

describe('a move is refused', () => {
  const why = (board: BoardFacts, asked: MoveWish) => {
    const result = moveBatch(board, asked);
    return result.ok ? 'granted' : result.why;
  };

  it('of a batch that is no longer where it was seen', () => {
    expect(why(season(), wish(3, { expectedChainId: two }))).toBe('moved-elsewhere');
  });
  it('of a batch that is fermenting', () => {
    expect(why(season({ 1: { stage: 'fermenting' } }), wish(1, { expectedChainId: one }))).toBe(
      'locked',
    );
  });
  it('to a place before a poured batch, and granted behind it', () => {
    const board = season({ 1: { stage: 'racked' }, 2: { stage: 'fermenting' } });
    expect(why(board, wish(5, { toChainId: one, afterBatchId: b(1) }))).toBe('locked');
    expect(why(board, wish(5, { toChainId: one, afterBatchId: b(2) }))).toBe('granted');
  });
  it('after a batch that has gone from there', () => {
    expect(why(season(), wish(5, { afterBatchId: b(1) }))).toBe('place-taken');
  });
  it('onto a chain that comes of its own cake', () => {
    const board = season();
    const chains = [makeChain(1), makeChain(2, { start: { kind: 'cake', batchId: b(3) } })];
    expect(why({ ...board, chains }, wish(3, { expectedChainId: one }))).toBe('own-branch');
  });
  it('of a batch or to a shelf that is not there', () => {
    expect(why(season(), wish(9, {}))).toBe('not-found');
    expect(why(season(), wish(5, { toChainId: idOf('chain', 9) }))).toBe('not-found');
  });
  it('but granted again where it already stands, whatever was seen', () => {
    const result = moveBatch(
      season(),
      wish(2, { toChainId: one, afterBatchId: b(1), expectedChainId: two }),
    );
    expect(result).toMatchObject({ ok: true, batches: [] });
  });
});
