import { useMemo } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { branchesFrom } from './descentOf.ts';
import { partWords } from './partWords.ts';

/** The shelves that part of this chain's cakes went to. */
export function Branches({ chain }: { chain: Chain }) {
  const { board, index, units } = useBoardView();
  const { path } = useBrewery();
  const branches = useMemo(() => branchesFrom(board, index, chain), [board, index, chain]);
  return branches.map((branch) => (
    <p key={branch.chain.id} className="mt-1 text-ink2">
      {branch.source.name}’s cake also starts{' '}
      <TextLink to={path(`chains/${branch.chain.id}`)}>{branch.chain.name}</TextLink>
      {partWords(branch, units)}
    </p>
  ));
}
