import type { Batch } from '#shared/api/batch.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { LinkButton } from '../../../components/ui/LinkButton.tsx';

/** To the page of the batch whose cake it is, where the cake is judged. */
export function CakeCheckLink({ cakeOf }: { cakeOf: Batch }) {
  const { path } = useBrewery();
  return (
    <LinkButton size="large" className="mt-4" to={path(`batches/${cakeOf.id}`)}>
      {cakeOf.cake?.check ? 'Look at the cake again' : 'Judge the cake'}
    </LinkButton>
  );
}
