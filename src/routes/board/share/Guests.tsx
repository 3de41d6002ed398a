import { useQuery } from '@tanstack/react-query';
import type { Chain } from '#shared/api/chain.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { guestsQuery } from '../../../api/guests.ts';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { GuestRow } from './GuestRow.tsx';
import { InviteGuest } from './InviteGuest.tsx';

/** People of other breweries, on whose own boards the chain stands. */
export function Guests({ chain }: { chain: Chain }) {
  const { slug, board } = useBoardView();
  const guests = useQuery(guestsQuery(slug, chain.id));
  return (
    <section aria-labelledby="chain-guests">
      <h3 id="chain-guests" className="text-h3">
        Guests from other breweries
      </h3>
      <p className="mt-0.5 text-ink2">
        The chain stands on their own board. They see its yeast and vessels, no prices and nothing
        else of this brewery.
      </p>
      {guests.error && (
        <Notice kind="hold" className="mt-3">
          {sentenceOf(guests.error)}
        </Notice>
      )}
      {guests.data?.length === 0 && <p className="mt-3 text-ink2">Nobody has been invited.</p>}
      {guests.data && guests.data.length > 0 && (
        <ul aria-label="Guests" className="mt-3 divide-y divide-line border-y border-line">
          {guests.data.map((guest) => (
            <GuestRow key={guest.id} guest={guest} chainId={chain.id} />
          ))}
        </ul>
      )}
      {board.me.can.invite && <InviteGuest chain={chain} />}
    </section>
  );
}
