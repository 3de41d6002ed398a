import type { Chain } from '#shared/api/chain.ts';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { Skeleton } from '../../../components/ui/Skeleton.tsx';

const Sharing = lazyPart(
  async () => (await import('./Sharing.tsx')).Sharing,
  <Skeleton label="Loading what is shared" />,
);

/** Who from elsewhere sees a chain, and how. */
export function ShareDialog({ chain, onClose }: { chain: Chain; onClose: () => void }) {
  return (
    <Dialog
      open
      wide
      onClose={onClose}
      title={`Share ${chain.name}`}
      lead="This chain and nothing else of the brewery. Allergens and live cultures are always shown."
    >
      <Sharing chain={chain} />
    </Dialog>
  );
}
