import { Ellipsis } from 'lucide-react';
import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { useBrewery } from '../../../app/useBrewery.ts';
import { Menu, MenuItem, MenuLink, MenuSeparator } from '../../../components/ui/Menu.tsx';
import { OnWholeBoard, useBoardView } from '../view/BoardView.tsx';
import { useOpenPanel } from '../view/useBoardPanel.ts';
import { DeleteBatch } from './DeleteBatch.tsx';
import { nextStages, STAGE_ACTIONS, type NextStage } from './stages.ts';

type Asked = NextStage | 'delete' | 'branch';

/** Its form comes when it is asked for. */
const StageDialog = lazyPart(async () => (await import('./StageDialog.tsx')).StageDialog);

const BranchDialog = lazyPart(async () => (await import('./BranchDialog.tsx')).BranchDialog);

/** Edit, duplicate, divide the cake, the stages that come next, scrap, delete. */
export function BatchMenu({ batch }: { batch: Batch }) {
  const [asked, setAsked] = useState<Asked | null>(null);
  return (
    <>
      <Menu
        button={{
          'aria-label': `More for ${batch.name}`,
          className:
            'grid size-[26px] place-items-center rounded-md text-ink3 hover:bg-line2 hover:text-ink max-tablet:size-11',
          children: <Ellipsis size={18} aria-hidden />,
        }}
      >
        <Items batch={batch} onAsk={setAsked} />
      </Menu>
      {asked !== null && (
        <OnWholeBoard>
          <AskedDialog batch={batch} asked={asked} onClose={() => setAsked(null)} />
        </OnWholeBoard>
      )}
    </>
  );
}

/** Its own part, so that what the items need is not asked for by each of hundreds of closed menus. */
function Items({ batch, onAsk }: { batch: Batch; onAsk: (asked: Asked) => void }) {
  const open = useOpenPanel();
  const { can } = useBoardView();
  const { path } = useBrewery();
  return (
    <>
      <MenuItem onSelect={() => open({ kind: 'batch', batchId: batch.id })}>Edit</MenuItem>
      <MenuLink to={path(`batches/${batch.id}`)}>Readings and cake</MenuLink>
      {can.setStages && (
        <>
          <MenuItem onSelect={() => open({ kind: 'new', what: 'batch', likeId: batch.id })}>
            Duplicate
          </MenuItem>
          {batch.chainId !== null && can.editChains && (
            <MenuItem onSelect={() => onAsk('branch')}>
              Pour part of this cake onto another wort
            </MenuItem>
          )}
          <MenuSeparator />
          {batch.stage === 'pencilled' && batch.chainId !== null && (
            <MenuLink to={path(`pour/${batch.id}`)}>Pour check</MenuLink>
          )}
          {nextStages(batch.stage).map((stage) => (
            <MenuItem key={stage} onSelect={() => onAsk(stage)}>
              {STAGE_ACTIONS[stage].menu}
            </MenuItem>
          ))}
          <MenuSeparator />
          <MenuItem danger onSelect={() => onAsk('delete')}>
            Delete
          </MenuItem>
        </>
      )}
    </>
  );
}

interface AskedDialogProps {
  batch: Batch;
  asked: Asked;
  onClose: () => void;
}

function AskedDialog({ batch, asked, onClose }: AskedDialogProps) {
  switch (asked) {
    case 'delete':
      return <DeleteBatch batch={batch} onClose={onClose} />;
    case 'branch':
      return <BranchDialog source={batch} onClose={onClose} />;
    default:
      return <StageDialog batch={batch} to={asked} onClose={onClose} />;
  }
}
