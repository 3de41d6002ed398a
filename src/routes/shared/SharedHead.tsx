import { Eye } from 'lucide-react';
import { Link } from 'react-router-dom';
import type { SharedChain } from '#shared/api/share.ts';
import { formatDay } from '#shared/units/day.ts';
import { formatMoney } from '#shared/units/money.ts';
import { Wordmark } from '../../components/ui/Wordmark.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { count, generationLine, yeastLine } from '../board/view/words.ts';

/** Top of the page: whose product this is, and that nothing can be changed here. */
export function SharedBar() {
  return (
    <header className="on-bar flex h-15 shrink-0 items-center justify-between bg-bar px-[22px] text-on-bar">
      <Link to="/" aria-label="Barmkin, front page" className="rounded-lg">
        <Wordmark />
      </Link>
      <p className="flex items-center gap-2 rounded-full border border-on-bar/30 px-3.5 py-1 text-small">
        <Eye size={17} aria-hidden />
        Read only
      </p>
    </header>
  );
}

/** "6 March to 1 May"; without days nothing. */
function spanOf(days: readonly (string | null)[]): string[] {
  const known = days.filter((day) => day !== null).toSorted();
  const [first, last] = [known[0], known.at(-1)];
  if (first === undefined || last === undefined) return [];
  return [first === last ? formatDay(first) : `${formatDay(first)} to ${formatDay(last)}`];
}

export function SharedHead({ shared }: { shared: SharedChain }) {
  const { index, judged, units } = useBoardView();
  const { chain, costPerBatch, currency, breweryName, sharedOn } = shared;
  const batches = index.batchesOf(chain.id);
  const verdicts = judged.chains.get(chain.id);
  const yeast = index.yeasts.get(chain.yeastId);
  const facts = [
    [count(batches.length, 'batch', 'batches'), ...spanOf(batches.map((row) => row.brewOn))].join(
      ', ',
    ),
    ...(costPerBatch === null ? [] : [`${formatMoney(costPerBatch, currency)} a batch`]),
  ];
  return (
    <>
      <h1 className="text-[2.25rem] leading-[1.05] font-[740] tracking-[-.03em] wrap-anywhere outline-none">
        {chain.name}
      </h1>
      <p className="mt-1.5 text-touch text-ink2">{facts.join(' · ')}</p>
      {yeast && (
        <p className="text-touch text-ink2">
          {yeast.name}, {yeastLine(yeast, units)}
        </p>
      )}
      {verdicts && (
        <p className="text-touch text-ink2">
          {shared.startsFromCake && 'starts from a cake of another chain, '}
          {generationLine(verdicts.generations, verdicts.generationLimit)}
        </p>
      )}
      <p className="mt-3 text-touch">
        <b className="wrap-anywhere">{breweryName}</b>{' '}
        <span className="text-ink2">shared this with you on {formatDay(sharedOn)}.</span>
      </p>
    </>
  );
}
