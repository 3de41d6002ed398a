import { Printer, Share } from 'lucide-react';
import { useState } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { formatDayShort } from '#shared/units/day.ts';
import { formatMoney } from '#shared/units/money.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { GenerationMarks } from '../../components/drawn/GenerationMarks.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { ShareDialog } from '../board/share/ShareDialog.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { count, generationLine } from '../board/view/words.ts';
import { Branches } from '../descent/Branches.tsx';
import { Descent } from '../descent/Descent.tsx';

/** Name of the chain, its span and its sum, where its cake comes from and where it goes besides. */
export function ChainHead({ chain }: { chain: Chain }) {
  const { board, judged, can } = useBoardView();
  const { path } = useBrewery();
  const verdicts = judged.chains.get(chain.id);
  return (
    <header className="flex flex-wrap items-end gap-x-5 gap-y-3 pr-7 max-tablet:pr-[18px]">
      <div className="min-w-0 flex-1 basis-80">
        <p className="text-small text-ink2 print:hidden">
          <TextLink to={path()}>Board</TextLink> / {board.season.name}
        </p>
        <h1 className="text-h1 tracking-[-0.025em]">{chain.name}</h1>
        <div className="mt-0.5 flex flex-wrap items-center gap-x-2.5 gap-y-1 text-ink2">
          <ChainSum chain={chain} />
          {verdicts && (
            <>
              <GenerationMarks
                generations={verdicts.generations}
                limit={verdicts.generationLimit}
              />
              <span>{generationLine(verdicts.generations, verdicts.generationLimit)}</span>
            </>
          )}
        </div>
        <Descent chain={chain} />
        <Branches chain={chain} />
      </div>
      <div className="flex gap-2.5 print:hidden">
        <LinkButton to={path(`print/chains/${chain.id}`)}>
          <Printer size={17} aria-hidden />
          Print
        </LinkButton>
        {can.editChains && <ShareButton chain={chain} />}
      </div>
    </header>
  );
}

function ShareButton({ chain }: { chain: Chain }) {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button look="first" onClick={() => setOpen(true)}>
        <Share size={17} aria-hidden />
        Share
      </Button>
      {isOpen && <ShareDialog chain={chain} onClose={() => setOpen(false)} />}
    </>
  );
}

/** "4 batches, 6 March to 1 May · $3.50 a batch". */
function ChainSum({ chain }: { chain: Chain }) {
  const { board, index, judged } = useBoardView();
  const batches = index.batchesOf(chain.id);
  const first = batches.find(({ brewOn }) => brewOn !== null)?.brewOn ?? null;
  const last = batches.flatMap(({ id }) => judged.rackOn.get(id) ?? []).at(-1) ?? null;
  const cost = judged.chains.get(chain.id)?.costPerBatch ?? null;
  const span = first && last ? `, ${formatDayShort(first)} to ${formatDayShort(last)}` : '';
  const each = cost === null ? '' : ` · ${formatMoney(cost, board.brewery.currency)} a batch`;
  return <p>{`${count(batches.length, 'batch', 'batches')}${span}${each}`}</p>;
}
