import { useMemo } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { useBoardPanel } from '../board/view/useBoardPanel.ts';
import { countedFindings } from '../board/view/words.ts';
import { originOf } from './descentOf.ts';
import { partWords } from './partWords.ts';

/** "from Jetty Pale's cake, 0.4 of 1.1 L", with what that link says: it stands on no shelf. */
export function Descent({ chain }: { chain: Chain }) {
  const { board, index, judged, units } = useBoardView();
  const { path } = useBrewery();
  const { open } = useBoardPanel();
  const origin = useMemo(() => originOf(board, index, chain), [board, index, chain]);
  if (!origin) return null;
  const first = index.batchesOf(chain.id)[0];
  const link = first && judged.links.get(first.id);
  return (
    <p className="mt-1 flex flex-wrap items-center gap-x-2 gap-y-1 text-small text-ink2">
      <span>
        from{' '}
        <TextLink to={path(`chains/${origin.source.chainId ?? ''}`)}>{origin.source.name}</TextLink>
        ’s cake{partWords(origin, units)}
      </span>
      {first && link && (
        <button
          type="button"
          onClick={() => open({ kind: 'link', laterId: first.id })}
          className="max-tablet:min-h-11"
        >
          <span className="sr-only">
            {first.name} onto {origin.source.name}:
          </span>
          <VerdictPill verdict={link.verdict} findings={countedFindings(link)} />
        </button>
      )}
    </p>
  );
}
