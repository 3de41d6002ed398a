import { newId } from '../../../app/newId.ts';
import { useCallback } from 'react';
import type { Batch, BatchCreate } from '#shared/api/batch.ts';
import { useBatchCreate } from '../../../api/batches.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../view/BoardView.tsx';

const LONGEST_NAME = 60;

/** "Chandler copy", cut so that the whole stays a name. */
export const copyName = (name: string): string =>
  `${name.slice(0, LONGEST_NAME - ' copy'.length).trimEnd()} copy`;

/** The same plan once more: what was read and what belongs to its link stays behind. */
export function copyOf(batch: Batch, id: string): BatchCreate {
  const { version, chainId, place, stage, read, cake, link, ...facts } = batch;
  return { ...facts, id, name: copyName(batch.name), brewOn: null };
}

/** Puts a copy of a batch on the bench. */
export function useDuplicate() {
  const { slug } = useBoardView();
  const { mutate } = useBatchCreate(slug);
  return useCallback(
    (batch: Batch) =>
      mutate(copyOf(batch, newId()), {
        onSuccess: (made) => say(`${made.name} is on the bench`),
        onError: (error) => say(sentenceOf(error)),
      }),
    [mutate],
  );
}
