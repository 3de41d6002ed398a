import { Link } from 'react-router-dom';
import type { Membership } from '#shared/api/people.ts';
import { ROLE_WORDS } from '../../app/words.ts';

export function ChoiceOfBreweries({ breweries }: { breweries: readonly Membership[] }) {
  if (breweries.length === 0) return null;
  return (
    <ul aria-label="Breweries that you belong to" className="space-y-3">
      {breweries.map(({ brewery, role }) => (
        <li key={brewery.id}>
          <Link
            to={`/b/${brewery.slug}`}
            className="block rounded-card border-[1.5px] border-edge bg-paper px-4 py-3 hover:bg-bottle-l"
          >
            <span className="block text-touch font-semibold wrap-anywhere">{brewery.name}</span>
            <span className="text-small text-ink2">{ROLE_WORDS[role]}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
