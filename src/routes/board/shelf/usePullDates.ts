import { useMemo } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { pullChain } from '#shared/chain/dates.ts';
import { useBoard, useBoardSlug } from '../../../api/board.ts';
import { usePullChain } from '../../../api/chains.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { say } from '../../../components/ui/Toast.tsx';
import { count } from '../view/words.ts';

/** Every pencilled batch of a chain brewed on the day the yeast before it is taken. */
export function usePullDates(chain: Chain) {
  const board = useBoard();
  const slug = useBoardSlug();
  const { shifted } = useMemo(() => pullChain(board, chain.id), [board, chain.id]);
  const { mutate } = usePullChain(slug);
  const run = () =>
    mutate(chain.id, {
      onSuccess: () => say(`${count(shifted.length, 'date')} on ${chain.name} pulled along`),
      onError: (error) => say(sentenceOf(error)),
    });
  return { shifts: shifted.length, run };
}
