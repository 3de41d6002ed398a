import clsx from 'clsx';
import type { Duty } from '#shared/today/duty.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import { daysBetween, formatDay } from '#shared/units/day.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { drawnVessel } from '../board/view/drawing.ts';
import { countedFindings } from '../board/view/words.ts';
import { dutyWords } from './dutyWords.ts';

interface DutyCardProps {
  duty: Duty;
  today: Day;
  dated: boolean;
  /** The first thing to do: a page has one. */
  isFirst?: boolean;
}

/** One thing to be done, with the one tap that leads to it. */
export function DutyCard({ duty, today, dated, isFirst = false }: DutyCardProps) {
  const { index, judged, board, units, can } = useBoardView();
  const { path } = useBrewery();
  const batch = index.batch(duty.batchId);
  if (!batch) return null;
  const words = dutyWords(duty, { index, units, today, can });
  const link = duty.kind === 'brew' ? judged.links.get(duty.batchId) : undefined;
  return (
    <li className="flex gap-4 rounded-card border-[1.5px] border-line bg-paper p-4">
      <div className="w-12 shrink-0 pt-1">
        <Vessel {...drawnVessel(batch, index, judged, board.today)} width={44} />
      </div>
      <div className="min-w-0 flex-1 tablet:flex tablet:items-center tablet:gap-6">
        <div className="min-w-0 flex-1">
          <When duty={duty} today={today} dated={dated} />
          <h3 className="text-[1.1875rem] leading-[1.2] font-bold wrap-anywhere">{words.title}</h3>
          {words.because !== '' && <p className="mt-1 text-ink2">{words.because}</p>}
          {link && (
            <p className="mt-2">
              <VerdictPill
                verdict={link.verdict}
                findings={countedFindings(link)}
                unchecked={link.unchecked.length}
                large
              />
            </p>
          )}
          {words.caution && <p className="mt-1 text-small text-ink2">{words.caution}</p>}
        </div>
        <LinkButton
          to={path(words.page)}
          look={isFirst ? 'first' : 'plain'}
          className="max-tablet:mt-3 max-tablet:w-full"
        >
          {words.action}
        </LinkButton>
      </div>
    </li>
  );
}

/** The day of what is still to come; how late the rest is. */
function When({ duty, today, dated }: DutyCardProps) {
  const late = daysBetween(duty.day, today);
  if (late <= 0 && !dated) return null;
  return (
    <p className={clsx('text-small font-semibold', late > 0 ? 'text-mind' : 'text-ink2')}>
      {late > 0
        ? lateWords(late)
        : late === -1
          ? `Tomorrow, ${formatDay(duty.day)}`
          : formatDay(duty.day)}
    </p>
  );
}

const lateWords = (days: number) => (days === 1 ? 'A day late' : `${days} days late`);
