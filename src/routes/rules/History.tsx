import type { HouseRulesPast } from '#shared/api/houseRules.ts';
import { formatDay } from '#shared/units/day.ts';
import { fromTo } from '#shared/record/facts.ts';
import { capital } from '#shared/rules/words.ts';

/** Who changed the house rules, when, and from what to what. */
export function History({ history }: { history: readonly HouseRulesPast[] }) {
  return (
    <section aria-labelledby="history" className="mt-10 max-w-4xl">
      <h2 id="history" className="font-display text-h2 font-bold tracking-[-.02em]">
        History
      </h2>
      {history.length === 0 ? (
        <p className="mt-2 text-ink2">Nobody has changed them: the limits are the defaults.</p>
      ) : (
        <ol className="mt-3 divide-y divide-line">
          {history.map((past) => (
            <li key={past.id} className="py-3">
              <p className="text-small text-ink2">
                {formatDay(past.day)} {past.day.slice(0, 4)}, {past.by}
              </p>
              <p className="mt-0.5 font-medium wrap-anywhere">{past.what}</p>
              {past.facts.length > 1 && (
                <ul className="mt-1 list-disc pl-5 text-small text-ink2">
                  {past.facts.map((fact) => (
                    <li key={fact.label}>
                      {capital(fact.label)} {fromTo(fact.from, fact.to)}
                    </li>
                  ))}
                </ul>
              )}
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}
