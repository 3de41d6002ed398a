import type { ReactNode } from 'react';

export interface Fact {
  term: string;
  value: ReactNode;
}

/** Short facts of a card; one that is not known says so. */
export function Facts({ facts }: { facts: readonly Fact[] }) {
  return (
    <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1 text-small">
      {facts.map((fact) => (
        <div key={fact.term} className="contents">
          <dt className="text-ink2">{fact.term}</dt>
          <dd className="min-w-0 font-medium wrap-anywhere">
            {fact.value ?? <span className="font-normal text-ink2">not written down</span>}
          </dd>
        </div>
      ))}
    </dl>
  );
}
