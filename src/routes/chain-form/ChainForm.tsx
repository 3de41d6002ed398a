import { lazyPart } from '../../app/lazyPart.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';

/** The form comes when it is asked for: the board opens without it. */
export const ChainForm = lazyPart(
  async () => (await import('./ChainFormNow.tsx')).ChainFormNow,
  <Skeleton label="Loading the form" />,
);
