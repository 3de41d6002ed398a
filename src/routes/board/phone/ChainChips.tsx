import clsx from 'clsx';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { VERDICT_WORDS } from '../../../components/drawn/verdictWords.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { matchesFirst } from '../finding/filter.ts';
import { useMatching } from '../finding/Matching.tsx';
import { useBoardView } from '../view/BoardView.tsx';

interface ChainChipsProps {
  chosen: string;
  onChoose: (chainId: string) => void;
}

/** The season's chains, the bench last; a chip shows where something is on hold. */
export function ChainChips({ chosen, onChoose }: ChainChipsProps) {
  const { index, judged } = useBoardView();
  const matches = useMatching();
  const has = (mates: readonly { id: string }[]) =>
    matches === null || mates.some(({ id }) => matches.has(id));
  const chains = matchesFirst(index.chains, ({ id }) => has(index.batchesOf(id)));
  return (
    <nav aria-label="Shelves" className="relative overflow-x-auto [scrollbar-width:none]">
      <ul className="flex w-max gap-2 px-[18px] pt-3 pb-2.5">
        {chains.map((chain) => (
          <Chip
            key={chain.id}
            name={chain.name}
            verdict={judged.chains.get(chain.id)?.verdict ?? 'pour'}
            isChosen={chain.id === chosen}
            isPale={!has(index.batchesOf(chain.id))}
            onChoose={() => onChoose(chain.id)}
          />
        ))}
        <Chip
          name={`Bench, ${index.bench.length}`}
          verdict="pour"
          isChosen={chosen === 'bench'}
          isPale={!has(index.bench)}
          onChoose={() => onChoose('bench')}
        />
      </ul>
    </nav>
  );
}

interface ChipProps {
  name: string;
  verdict: Verdict;
  isChosen: boolean;
  /** The filter lets nothing of it through. */
  isPale: boolean;
  onChoose: () => void;
}

function Chip({ name, verdict, isChosen, isPale, onChoose }: ChipProps) {
  return (
    <li>
      <button
        type="button"
        aria-current={isChosen ? 'true' : undefined}
        onClick={onChoose}
        className={clsx(
          'flex min-h-11 max-w-64 items-center gap-2 rounded-full border-[1.5px] px-4 text-body font-semibold',
          isChosen ? 'border-ink bg-ink text-stone' : 'border-edge',
          !isChosen && (isPale ? 'border-dashed text-ink2' : 'text-ink'),
        )}
      >
        <span className="truncate">{name}</span>
        {verdict === 'hold' && (
          <span className={isChosen ? '[--in-badge:var(--ink)]' : 'text-hold'}>
            <VerdictMark verdict={verdict} size={15} />
            <span className="sr-only">, {VERDICT_WORDS[verdict]}</span>
          </span>
        )}
      </button>
    </li>
  );
}
