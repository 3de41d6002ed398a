import type { Chain } from '#shared/api/chain.ts';
import { ShareLinks } from './ShareLinks.tsx';

export function Sharing({ chain }: { chain: Chain }) {
  return (
    <div className="space-y-8">
      <ShareLinks chain={chain} />
    </div>
  );
}
