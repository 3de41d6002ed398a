import { useId } from 'react';
import type { Duty } from '#shared/today/duty.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import { DutyCard } from './DutyCard.tsx';

interface DutyListProps {
  title: string;
  duties: readonly Duty[];
  today: Day;
  /** Each says its day. */
  dated?: boolean;
}

export function DutyList({ title, duties, today, dated = false }: DutyListProps) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="mt-6 first:mt-0">
      <h2 id={id} className="mb-3 font-display text-h2 font-bold tracking-[-.02em]">
        {title}
      </h2>
      <ul className="space-y-3">
        {duties.map((duty, at) => (
          <DutyCard
            key={duty.key}
            duty={duty}
            today={today}
            dated={dated}
            isFirst={!dated && at === 0}
          />
        ))}
      </ul>
    </section>
  );
}
