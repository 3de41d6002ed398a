import type { Chain } from '#shared/api/chain.ts';
import { Guests } from './Guests.tsx';
import { ShareLinks } from './ShareLinks.tsx';

export function Sharing({ chain }: { chain: Chain }) {
  return (
    <div className="space-y-8">
      <ShareLinks chain={chain} />
      <Guests chain={chain} />
    </div>
  );
}
