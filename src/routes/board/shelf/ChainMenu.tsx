import { ChevronDown } from 'lucide-react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Chain } from '#shared/api/chain.ts';
import { useChainDelete } from '../../../api/chains.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { Menu, MenuItem, MenuSeparator } from '../../../components/ui/Menu.tsx';
import { ChainFormDialog } from '../../chain-form/ChainFormDialog.tsx';
import { ShareDialog } from '../share/ShareDialog.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { count } from '../view/words.ts';
import { usePullDates } from './usePullDates.ts';

/** Edit the shelf, pull its dates along, delete it. */
export function ChainMenu({ chain }: { chain: Chain }) {
  const [asked, setAsked] = useState<'edit' | 'share' | 'delete' | null>(null);
  const { path } = useBrewery();
  const pull = usePullDates(chain);
  const close = () => setAsked(null);
  return (
    <>
      <Menu
        align="start"
        trigger={
          <button
            type="button"
            aria-label={`Shelf ${chain.name}`}
            className="flex min-h-[26px] items-center gap-1 rounded-md px-1.5 text-small text-ink2 hover:bg-line2 hover:text-ink max-tablet:min-h-11"
          >
            Shelf
            <ChevronDown size={15} aria-hidden />
          </button>
        }
      >
        <MenuItem asChild>
          <Link to={path(`chains/${chain.id}`)}>Open the chain</Link>
        </MenuItem>
        <MenuItem onSelect={() => setAsked('edit')}>Edit the shelf</MenuItem>
        <MenuItem onSelect={() => setAsked('share')}>Share</MenuItem>
        <MenuItem disabled={pull.shifts === 0} onSelect={pull.run}>
          {pull.shifts === 0 ? 'Dates follow the cake' : `Pull ${count(pull.shifts, 'date')} along`}
        </MenuItem>
        <MenuSeparator />
        <MenuItem danger onSelect={() => setAsked('delete')}>
          Delete the shelf
        </MenuItem>
      </Menu>
      {asked === 'edit' && <ChainFormDialog chain={chain} onClose={close} />}
      {asked === 'share' && <ShareDialog chain={chain} onClose={close} />}
      {asked === 'delete' && <DeleteChain chain={chain} onClose={close} />}
    </>
  );
}

function DeleteChain({ chain, onClose }: { chain: Chain; onClose: () => void }) {
  const { slug, index } = useBoardView();
  const remove = useChainDelete(slug);
  const batches = index.batchesOf(chain.id).filter((batch) => batch.stage === 'pencilled');
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Delete the shelf ${chain.name}?`}
      action="Delete the shelf"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() =>
        remove.mutate({ id: chain.id, version: chain.version }, { onSuccess: onClose })
      }
    >
      <p>
        {batches.length === 0
          ? 'No pencilled batch stands on it.'
          : `Its ${count(batches.length, 'pencilled batch', 'pencilled batches')} ${batches.length === 1 ? 'goes' : 'go'} back to the bench.`}
      </p>
    </ConfirmDialog>
  );
}
