import type { Membership } from '#shared/api/people.ts';

interface BreweryChoiceProps {
  breweries: readonly Membership['brewery'][];
  /** Slug. */
  chosen: string;
  onChoose: (slug: string) => void;
  legend: string;
}

/** One of the breweries that somebody belongs to. */
export function BreweryChoice({ breweries, chosen, onChoose, legend }: BreweryChoiceProps) {
  return (
    <fieldset className="space-y-1">
      <legend className="mb-1 font-semibold">{legend}</legend>
      {breweries.map(({ slug, name }) => (
        <label key={slug} className="flex min-h-11 items-center gap-2.5">
          <input
            type="radio"
            name="brewery"
            checked={slug === chosen}
            onChange={() => onChoose(slug)}
            className="size-5 shrink-0 accent-bottle"
          />
          <span className="min-w-0 font-medium wrap-anywhere">{name}</span>
        </label>
      ))}
    </fieldset>
  );
}
