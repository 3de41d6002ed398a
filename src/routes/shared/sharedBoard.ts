import type { Board } from '#shared/api/board.ts';
import type { SharedChain } from '#shared/api/share.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { indexBoard } from '#shared/chain/board.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { NOTHING, type BoardViewValue } from '../board/view/BoardView.tsx';

const NOBODY = '00000000-0000-4000-8000-000000000000';
const SLUG = 'shared';

/** A board with nothing on it but the chain that is shown, and nobody who may change it. */
function boardOf(shared: SharedChain): Board {
  const { breweryName, currency, units, today, houseRules, yeasts, vessels, batches } = shared;
  return {
    brewery: {
      id: NOBODY,
      slug: SLUG,
      version: 1,
      name: breweryName,
      timeZone: 'UTC',
      currency,
      units,
    },
    season: {
      id: NOBODY,
      version: 1,
      name: breweryName,
      revision: 0,
      brewWeekdays: [],
      brewsPerDay: 20,
      blockedDays: [],
      firstDay: null,
      lastDay: null,
      isArchived: false,
    },
    today,
    me: { personId: NOBODY, role: 'taster', can: NOTHING },
    houseRules,
    members: [],
    yeasts,
    vessels,
    chains: [shared.chain],
    batches,
    undo: null,
    redo: null,
    unread: {},
    guests: [],
  };
}

/** What the drawn parts of the board need to show the chain: its order and verdicts, and no hands. */
export function sharedView(shared: SharedChain, units: UnitPrefs): BoardViewValue {
  const board = boardOf(shared);
  return {
    board,
    index: indexBoard(board),
    judged: judgeBoard(board, units),
    units,
    slug: SLUG,
    can: NOTHING,
    mayWriteDown: false,
    online: true,
  };
}
