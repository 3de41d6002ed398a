import { useMemo } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { pullChain } from '#shared/chain/dates.ts';
import { useBatchPatch } from '../../../api/batches.ts';
import { useBoard, useBoardSlug } from '../../../api/board.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { say } from '../../../components/ui/Toast.tsx';
import { count } from '../view/words.ts';

/** Every pencilled batch of a chain brewed on the day the yeast before it is taken. */
export function usePullDates(chain: Chain) {
  const board = useBoard();
  const slug = useBoardSlug();
  const { shifted } = useMemo(() => pullChain(board, chain.id), [board, chain.id]);
  const { mutateAsync } = useBatchPatch(slug);
  const run = async () => {
    try {
      for (const { batchId, to } of shifted) {
        const version = board.batches.find(({ id }) => id === batchId)?.version;
        if (version) await mutateAsync({ id: batchId, version, patch: { brewOn: to } });
      }
      say(`${count(shifted.length, 'date')} on ${chain.name} pulled along`);
    } catch (error) {
      say(sentenceOf(error));
    }
  };
  return { shifts: shifted.length, run: () => void run() };
}
