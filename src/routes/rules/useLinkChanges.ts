import { useDeferredValue, useMemo } from 'react';
import type { HouseRuleChanges } from '#shared/api/board.ts';
import { linkChanges, type LinkChange } from '#shared/chain/linkChanges.ts';
import { useBoard } from '../../api/board.ts';
import { useUnits } from '../../app/useUnits.ts';

/** Null while a field has a fault: nothing can be judged by it. Worked out after the typing. */
export function useLinkChanges(changes: HouseRuleChanges, isSound: boolean): LinkChange[] | null {
  const board = useBoard();
  const units = useUnits();
  const text = useDeferredValue(isSound ? JSON.stringify(changes) : null);
  return useMemo(
    () =>
      text === null
        ? null
        : linkChanges(board, { ...board, houseRules: JSON.parse(text) as HouseRuleChanges }, units),
    [board, text, units],
  );
}
