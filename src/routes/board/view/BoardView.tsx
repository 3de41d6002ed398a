import {
  createContext,
  use,
  useLayoutEffect,
  useMemo,
  useState,
  useSyncExternalStore,
  type ReactNode,
} from 'react';
import type { Board } from '#shared/api/board.ts';
import type { Abilities } from '#shared/api/people.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { indexBoard, type BoardIndex } from '#shared/chain/board.ts';
import type { JudgedBoard } from '#shared/chain/judgeBoard.ts';
import { useBoard, useBoardSlug, useJudged } from '../../../api/board.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { createViewSource, type ViewSource } from './viewSource.ts';

export interface BoardViewValue {
  board: Board;
  index: BoardIndex;
  judged: JudgedBoard;
  units: UnitPrefs;
  slug: string;
  /** What this person may do now; nothing while there is no connection. */
  can: Abilities;
  /** Readings, notes and what else is kept without a connection, they may write down at any time. */
  mayWriteDown: boolean;
  online: boolean;
}

const WholeBoard = createContext<ViewSource<BoardViewValue> | null>(null);
/** Null: what is drawn here shows the whole board. */
const BoardPart = createContext<BoardViewValue | null>(null);

export const NOTHING: Abilities = {
  editBatches: false,
  moveBatches: false,
  moveAcross: false,
  setStages: false,
  editChains: false,
  editYeastsAndVessels: false,
  editSeason: false,
  acceptHolds: false,
  invite: false,
};

/** The board, its order and its verdicts, worked out once for all that is drawn from them. */
export function BoardViewProvider({ children }: { children: ReactNode }) {
  const board = useBoard();
  const judged = useJudged();
  const units = useUnits();
  const slug = useBoardSlug();
  const online = useOnline();
  const value = useMemo(
    () => ({
      board,
      index: indexBoard(board),
      judged,
      units,
      slug,
      can: online ? board.me.can : NOTHING,
      mayWriteDown: board.me.can.setStages,
      online,
    }),
    [board, judged, units, slug, online],
  );
  return <BoardViewOf value={value}>{children}</BoardViewOf>;
}

/** The same parts for a board that comes from elsewhere, such as behind a link. */
export function BoardViewOf({ value, children }: { value: BoardViewValue; children: ReactNode }) {
  const [source] = useState(createViewSource<BoardViewValue>);
  // Shown while drawing, so that what is drawn below in the same pass finds it; told once that is done.
  source.show(value);
  useLayoutEffect(() => source.tell(), [source, value]);
  return (
    <WholeBoard value={source}>
      <BoardPart value={null}>{children}</BoardPart>
    </WholeBoard>
  );
}

/** For a part of the board: the view that it is drawn from. */
export function BoardPartView({ view, children }: { view: BoardViewValue; children: ReactNode }) {
  return <BoardPart value={view}>{children}</BoardPart>;
}

/** For what a part of the board opens and what looks beyond that part: the whole board, as it is now. */
export function OnWholeBoard({ children }: { children: ReactNode }) {
  return <BoardPart value={null}>{children}</BoardPart>;
}

export function useBoardView(): BoardViewValue {
  const part = use(BoardPart);
  const whole = use(WholeBoard);
  const view = useSyncExternalStore(
    part || !whole ? neverChanges : whole.subscribe,
    () => part ?? whole?.get() ?? null,
  );
  if (!view) throw new Error('Only inside the board');
  return view;
}

const neverChanges = () => () => {};
