import { lazyPart } from '../../app/lazyPart.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';

/** The form comes when it is asked for: the board opens without it. */
export const BatchForm = lazyPart(
  async () => (await import('./BatchFormNow.tsx')).BatchFormNow,
  <Skeleton label="Loading the form" />,
);
