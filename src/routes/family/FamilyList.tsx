import type { Kin } from '#shared/chain/family.ts';
import { lowered } from '../../app/lowered.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { countedFindings, stageLine } from '../board/view/words.ts';
import { startWords } from './kinWords.ts';

/** The family to be read or heard: each batch under the one whose cake it goes onto. */
export function FamilyList({ family }: { family: readonly Kin[] }) {
  return (
    <ul className="mt-2 space-y-3">
      {family.map((kin) => (
        <KinItem key={kin.id} kin={kin} />
      ))}
    </ul>
  );
}

function KinItem({ kin }: { kin: Kin }) {
  const { board } = useBoardView();
  const { path } = useBrewery();
  return (
    <li>
      <p className="flex min-h-8 flex-wrap items-center gap-x-2 gap-y-0.5">
        <TextLink to={path(`chains/${kin.chain.id}`)}>
          {kin.kind === 'start' ? kin.chain.name : kin.batch.name}
        </TextLink>
        <span className="text-ink2">
          {kin.kind === 'start'
            ? startWords(kin.chain)
            : [
                ...(kin.generation === null ? [] : [`generation ${kin.generation}`]),
                lowered(stageLine(kin.batch, board.today)),
              ].join(', ')}
        </span>
        {kin.kind === 'batch' && kin.link && (
          <VerdictPill verdict={kin.link.verdict} findings={countedFindings(kin.link)} />
        )}
      </p>
      {kin.children.length > 0 && (
        <ul
          className={
            kin.children.length > 1 || kin.kind === 'start' ? 'border-l border-line pl-4' : ''
          }
        >
          {kin.children.map((child) => (
            <KinItem key={child.id} kin={child} />
          ))}
        </ul>
      )}
    </li>
  );
}
