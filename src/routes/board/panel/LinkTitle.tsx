import type { Batch } from '#shared/api/batch.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import { daysBetween, formatDay } from '#shared/units/day.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { countedFindings } from '../view/words.ts';

interface LinkTitleProps {
  earlier: Batch;
  later: Batch;
  answer: LinkAnswer;
  accepted: boolean;
}

/** "Pour on Fri 3 April, day 14 of Jetty Pale"; what is known of it. */
export function pourLine(earlier: Batch, later: Batch): string {
  if (later.brewOn === null) return 'No pouring day yet';
  const on = `Pour${later.stage === 'pencilled' ? '' : 'ed'} on ${formatDay(later.brewOn)}`;
  if (earlier.brewOn === null) return on;
  const day = daysBetween(earlier.brewOn, later.brewOn);
  return day < 0 ? `${on}, before ${earlier.name}` : `${on}, day ${day} of ${earlier.name}`;
}

export function LinkTitle({ earlier, later, answer, accepted }: LinkTitleProps) {
  return (
    <header className="pr-8">
      {/* Read out when the verdict changes while the kept part is tried. */}
      <div aria-live="polite" className="flex flex-wrap items-center gap-2">
        <VerdictPill
          verdict={answer.verdict}
          findings={countedFindings(answer)}
          unchecked={answer.unchecked.length}
        />
        {accepted && <span className="text-label font-bold text-ink2">accepted</span>}
      </div>
      <h2 className="mt-2.5 text-h2">
        {later.name} onto {earlier.name}
      </h2>
      <p className="mt-0.5 text-ink2">
        {pourLine(earlier, later)}
        {answer.generation !== null && ` · generation ${answer.generation}`}
      </p>
    </header>
  );
}
