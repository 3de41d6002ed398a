import { ChevronDown } from 'lucide-react';
import { useState } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { useChainDelete } from '../../../api/chains.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { Menu, MenuItem, MenuLink, MenuSeparator } from '../../../components/ui/Menu.tsx';
import { ChainFormDialog } from '../../chain-form/ChainFormDialog.tsx';
import { ShareDialog } from '../share/ShareDialog.tsx';
import { OnWholeBoard, useBoardView } from '../view/BoardView.tsx';
import { count } from '../view/words.ts';
import { usePullDates } from './usePullDates.ts';

/** Edit the shelf, pull its dates along, delete it. */
export function ChainMenu({ chain }: { chain: Chain }) {
  const [asked, setAsked] = useState<'edit' | 'share' | 'delete' | null>(null);
  const { path } = useBrewery();
  const close = () => setAsked(null);
  return (
    <>
      <Menu
        align="start"
        button={{
          'aria-label': `Shelf ${chain.name}`,
          className:
            'flex min-h-[26px] items-center gap-1 rounded-md px-1.5 text-small text-ink2 hover:bg-line2 hover:text-ink max-tablet:min-h-11',
          children: (
            <>
              Shelf
              <ChevronDown size={15} aria-hidden />
            </>
          ),
        }}
      >
        <MenuLink to={path(`chains/${chain.id}`)}>Open the chain</MenuLink>
        <MenuItem onSelect={() => setAsked('edit')}>Edit the shelf</MenuItem>
        <MenuItem onSelect={() => setAsked('share')}>Share</MenuItem>
        <PullItem chain={chain} />
        <MenuSeparator />
        <MenuItem danger onSelect={() => setAsked('delete')}>
          Delete the shelf
        </MenuItem>
      </Menu>
      {asked !== null && (
        <OnWholeBoard>
          {asked === 'edit' && <ChainFormDialog chain={chain} onClose={close} />}
          {asked === 'share' && <ShareDialog chain={chain} onClose={close} />}
          {asked === 'delete' && <DeleteChain chain={chain} onClose={close} />}
        </OnWholeBoard>
      )}
    </>
  );
}

/** Worked out when the menu is open, from the whole board as it is then. */
function PullItem({ chain }: { chain: Chain }) {
  const { shifts, run } = usePullDates(chain);
  return (
    <MenuItem disabled={shifts === 0} onSelect={run}>
      {shifts === 0 ? 'Dates follow the cake' : `Pull ${count(shifts, 'date')} along`}
    </MenuItem>
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
