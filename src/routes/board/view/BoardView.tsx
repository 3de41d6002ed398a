import { createContext, use, useMemo, type ReactNode } from 'react';
import type { Board } from '#shared/api/board.ts';
import type { Abilities } from '#shared/api/people.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { indexBoard, type BoardIndex } from '#shared/chain/board.ts';
import type { JudgedBoard } from '#shared/chain/judgeBoard.ts';
import { useBoard, useBoardSlug, useJudged } from '../../../api/board.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { useUnits } from '../../../app/useUnits.ts';

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

const BoardView = createContext<BoardViewValue | null>(null);
const WholeBoardView = createContext<BoardViewValue | null>(null);

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
  return (
    <WholeBoardView value={value}>
      <BoardView value={value}>{children}</BoardView>
    </WholeBoardView>
  );
}

/** For a part of the board: the view that it is drawn from. */
export function BoardPartView({ view, children }: { view: BoardViewValue; children: ReactNode }) {
  return <BoardView value={view}>{children}</BoardView>;
}

/** For what a part of the board opens and what looks beyond that part: the whole board, as it is now. */
export function OnWholeBoard({ children }: { children: ReactNode }) {
  return <BoardView value={use(WholeBoardView)}>{children}</BoardView>;
}

export function useBoardView(): BoardViewValue {
  const value = use(BoardView);
  if (!value) throw new Error('Only inside the board');
  return value;
}
