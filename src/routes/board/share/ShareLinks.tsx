import { useQuery } from '@tanstack/react-query';
import type { Chain } from '#shared/api/chain.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { shareLinksQuery } from '../../../api/share.ts';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { MakeShareLink } from './MakeShareLink.tsx';
import { ShareLinkRow } from './ShareLinkRow.tsx';

/** Read-only links: for a look, without an account. */
export function ShareLinks({ chain }: { chain: Chain }) {
  const { slug, board } = useBoardView();
  const links = useQuery(shareLinksQuery(slug, chain.id));
  return (
    <section aria-labelledby="share-links">
      <h3 id="share-links" className="text-h3">
        Links to look at it
      </h3>
      <p className="mt-0.5 text-ink2">
        Whoever has one sees the chain as it is on that day, without an account.
      </p>
      {links.error && (
        <Notice kind="hold" className="mt-3">
          {sentenceOf(links.error)}
        </Notice>
      )}
      {links.data?.length === 0 && <p className="mt-3 text-ink2">No link has been made.</p>}
      {links.data && links.data.length > 0 && (
        <ul aria-label="Links" className="mt-3 divide-y divide-line border-y border-line">
          {links.data.map((link) => (
            <ShareLinkRow key={link.id} link={link} chainId={chain.id} />
          ))}
        </ul>
      )}
      {board.me.can.invite && <MakeShareLink chain={chain} />}
    </section>
  );
}
