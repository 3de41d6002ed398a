import { queryOptions, useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { createContext, use, useMemo, useSyncExternalStore } from 'react';
import { board as boardContract, type Board } from '#shared/api/board.ts';
import type { MoveRequest } from '#shared/api/move.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { api } from '#shared/api/urls.ts';
import { judgeBoard, type JudgedBoard } from '#shared/chain/judgeBoard.ts';
import { usePlace } from '../app/useBrewery.ts';
import { METRIC } from '../app/units.ts';
import { useUnits } from '../app/useUnits.ts';
import { KEPT } from '../kept/meta.ts';
import { request } from './client.ts';
import { equalDeep } from './equalDeep.ts';
import { keepEqualRows } from './keepEqualRows.ts';
import { withPending } from './pendingMoves.ts';
import { pendingOf } from './pendingStore.ts';
import { sessionQuery } from './session.ts';
import { boardStillness } from './stillness.ts';

/** A season's board as the server tells it. The only owner of its key. */
export function boardQuery(slug: string) {
  const queryKey = ['board', slug] as const;
  return queryOptions({
    queryKey,
    queryFn: async ({ client, signal }): Promise<Board> => {
      const before = client.getQueryData<Board>(queryKey);
      const fresh = await request(boardContract, 'GET', api.board(slug), { signal });
      await boardStillness.quiet(fresh);
      return newest(before, client.getQueryData<Board>(queryKey), fresh);
    },
    staleTime: 30_000,
    refetchOnWindowFocus: 'always',
    networkMode: 'always',
    structuralSharing: keepEqualRows,
    ...KEPT,
  });
}

/** A move may be answered while a slower read is under way; the read is then the older of the two. */
function newest(before: Board | undefined, now: Board | undefined, fresh: Board): Board {
  const isOvertaken =
    now &&
    now !== before &&
    now.season.id === fresh.season.id &&
    now.season.revision > fresh.season.revision;
  return isOvertaken ? now : fresh;
}

/** Verdicts of one board, kept for as long as that board is: many components ask for the same. */
const judged = new WeakMap<Board, Map<string, JudgedBoard>>();

function judgedBoard(board: Board, units: UnitPrefs): JudgedBoard {
  const byUnits = judged.get(board) ?? new Map<string, JudgedBoard>();
  const key = [units.system, units.gravity, units.colour, units.temperature].join();
  const known = byUnits.get(key);
  if (known) return known;
  const before = newestJudged.get(board.season.id);
  const result = withEqualKept(judgeBoard(board, units), before);
  newestJudged.set(board.season.id, result);
  judged.set(board, byUnits.set(key, result));
  return result;
}

/** By season: boards of other breweries may be drawn beside one's own. */
const newestJudged = new Map<string, JudgedBoard>();

/** What is judged as it was before stays the same object, so that it need not be drawn anew. */
function withEqualKept(now: JudgedBoard, before: JudgedBoard | undefined): JudgedBoard {
  if (!before) return now;
  return {
    ...now,
    links: equalKept(now.links, before.links),
    chains: equalKept(now.chains, before.chains),
  };
}

function equalKept<T>(now: ReadonlyMap<string, T>, before: ReadonlyMap<string, T>): Map<string, T> {
  const kept = new Map<string, T>();
  for (const [id, one] of now) {
    const was = before.get(id);
    kept.set(id, was !== undefined && equalDeep(was, one) ? was : one);
  }
  return kept;
}

/** The slug of another brewery, around a shelf of theirs on which one is a guest. */
export const OtherBoardSlug = createContext<string | null>(null);

/** True on a shelf of another brewery. */
export const useIsGuestHere = (): boolean => use(OtherBoardSlug) !== null;

/** Whose board it is that is drawn here: the brewery's in the address, if no other is named. */
export function useBoardSlug(): string {
  const other = use(OtherBoardSlug);
  const place = usePlace();
  if (other !== null) return other;
  if (place === null) throw new Error('A board is shown under the address of its brewery');
  return place;
}

/** The board of the brewery in the address, with the moves that are still on their way. */
export function useBoard(): Board {
  const slug = useBoardSlug();
  const { data } = useSuspenseQuery(boardQuery(slug));
  const { get, subscribe } = pendingOf(slug);
  const pending = useSyncExternalStore(subscribe, get);
  return withPending(data, pending);
}

/** The same board outside of drawing: what the page shows, or is about to show. */
export function readBoard(client: QueryClient, slug: string): Board {
  const board = client.getQueryData(boardQuery(slug).queryKey);
  if (!board) throw new Error('The board has not arrived yet');
  return withPending(board, pendingOf(slug).get());
}

/** Judges a board that is to be shown next, so that it is only drawn then. */
export function judgeAhead(client: QueryClient, board: Board): void {
  judgedBoard(board, client.getQueryData(sessionQuery.queryKey)?.units ?? METRIC);
}

/** Works out and judges the board as a wish will leave it. */
export const foresee = (client: QueryClient, slug: string, wish: MoveRequest): void =>
  judgeAhead(client, withPending(readBoard(client, slug), [wish]));

/** Every verdict of the board, in the person's units. */
export function useJudged(): JudgedBoard {
  const board = useBoard();
  const units = useUnits();
  return useMemo(() => judgedBoard(board, units), [board, units]);
}
