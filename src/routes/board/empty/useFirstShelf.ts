import { newId } from '../../../app/newId.ts';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import type { YeastCreate } from '#shared/api/yeast.ts';
import type { YeastKind } from '#shared/rules/vocabulary.ts';
import { useChainCreate } from '../../../api/chains.ts';
import { isProblem } from '../../../api/errors.ts';
import { useYeastCreate } from '../../../api/yeasts.ts';
import { useBoardView } from '../view/BoardView.tsx';

interface FirstYeast {
  name: string;
  kind: YeastKind;
}

/** A yeast of which only its name and kind are known; the rules then take the usual ranges. */
const plainYeast = (id: string, { name, kind }: FirstYeast): YeastCreate => ({
  id,
  name,
  kind,
  character: false,
  fermentMinC: null,
  fermentMaxC: null,
  pourMinC: null,
  pourMaxC: null,
  neverAboveC: null,
  generationLimit: null,
  attenuation: null,
  packPrice: null,
  notes: '',
  typed: {},
});

/** Makes a yeast and the shelf that starts from a pack of it. Ids stay, so that a retry doubles nothing. */
export function useFirstShelf() {
  const { slug, board } = useBoardView();
  const [ids] = useState(() => ({ yeast: newId(), chain: newId() }));
  const yeast = useYeastCreate(slug);
  const chain = useChainCreate(slug);
  return useMutation({
    mutationFn: async (wish: FirstYeast) => {
      const known = board.yeasts.find(({ name }) => name === wish.name);
      const yeastId = known?.id ?? ids.yeast;
      if (!known)
        await yeast.mutateAsync(plainYeast(yeastId, wish)).catch((error: unknown) => {
          if (!isProblem(error, 'already-exists')) throw error;
        });
      return chain.mutateAsync({
        id: ids.chain,
        name: wish.name,
        yeastId,
        vesselId: board.vessels[0]?.id ?? null,
        start: { kind: 'pack', price: known?.packPrice ?? null },
      });
    },
  });
}
