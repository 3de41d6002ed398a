import { Link } from 'react-router-dom';
import type { GuestPlace } from '#shared/api/people.ts';
import { guestAddress } from '../../app/guestAddress.ts';

/** Chains of other breweries: each stands on a board of one's own, and is shown there. */
export function GuestPlaces({ places }: { places: readonly GuestPlace[] }) {
  if (places.length === 0) return null;
  return (
    <section aria-labelledby="as-a-guest" className="mt-8">
      <h2 id="as-a-guest" className="text-shelf font-bold tracking-[-.02em]">
        As a guest
      </h2>
      <ul className="mt-3 space-y-3">
        {places.map((place) => (
          <li key={place.guestId}>
            <Link
              to={guestAddress(place)}
              className="block rounded-card border-[1.5px] border-dashed border-edge px-4 py-3 hover:bg-bottle-l"
            >
              <span className="block font-semibold wrap-anywhere">{place.chainName}</span>
              <span className="text-small text-ink2">from {place.fromBrewery}</span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
