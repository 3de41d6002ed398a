import { useId } from 'react';
import { Button } from '../../../components/ui/Button.tsx';
import { VERDICT_WORDS } from '../../../components/drawn/verdictWords.ts';
import { VERDICTS } from '#shared/rules/vocabulary.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { count } from '../view/words.ts';
import { SHOWN_STAGES, type Filter } from './filter.ts';
import { useMatching } from './Matching.tsx';
import { useFilter } from './useFilter.ts';

const STAGE_WORDS = { pencilled: 'Pencilled', fermenting: 'Fermenting', racked: 'Racked' } as const;

/** What is looked at, by yeast, vessel, verdict and stage, with how much that is. */
export function FilterRow() {
  const { board } = useBoardView();
  const { isOn, clear } = useFilter();
  const named = (rows: readonly { id: string; name: string }[]) =>
    rows.map(({ id, name }) => ({ value: id, label: name }));
  return (
    <section
      aria-label="Filter"
      className="flex flex-wrap items-end gap-x-3 gap-y-2 px-7 pt-2 pb-3 max-tablet:px-[18px] print:hidden"
    >
      <Choice name="yeast" label="Yeast" any="Any yeast" options={named(board.yeasts)} />
      <Choice name="vessel" label="Vessel" any="Any vessel" options={named(board.vessels)} />
      <Choice
        name="verdict"
        label="Verdict of the link before"
        any="Any verdict"
        options={VERDICTS.map((value) => ({ value, label: VERDICT_WORDS[value] }))}
      />
      <Choice
        name="stage"
        label="Stage"
        any="Any stage"
        options={SHOWN_STAGES.map((value) => ({ value, label: STAGE_WORDS[value] }))}
      />
      <MatchCount />
      {isOn && (
        <Button look="quiet" onClick={clear}>
          Show all again
        </Button>
      )}
    </section>
  );
}

interface ChoiceProps {
  name: keyof Filter;
  label: string;
  any: string;
  options: readonly { value: string; label: string }[];
}

function Choice({ name, label, any, options }: ChoiceProps) {
  const id = useId();
  const { filter, choose } = useFilter();
  return (
    <div className="min-w-0 max-tablet:basis-[calc(50%-.375rem)]">
      <label htmlFor={id} className="mb-0.5 block text-small font-semibold">
        {label}
      </label>
      <select
        id={id}
        value={filter[name] ?? ''}
        onChange={(event) => choose(name, event.target.value || null)}
        className="min-h-9 w-full max-w-52 rounded-field border-[1.5px] border-edge bg-white px-2 text-body text-ink max-tablet:min-h-11 max-tablet:max-w-none max-tablet:text-touch"
      >
        <option value="">{any}</option>
        {options.map(({ value, label: words }) => (
          <option key={value} value={value}>
            {words}
          </option>
        ))}
      </select>
    </div>
  );
}

/** Read out when it changes. */
function MatchCount() {
  const { index } = useBoardView();
  const matches = useMatching();
  const shelved = index.chains.map(({ id }) => index.batchesOf(id));
  const all = shelved.flat().length + index.bench.length;
  const shelves = shelved.filter((mates) => mates.some(({ id }) => matches?.has(id))).length;
  return (
    <p role="status" className="min-w-0 basis-56 self-center text-ink2 max-tablet:grow">
      {matches === null
        ? `All ${count(all, 'batch', 'batches')} are shown.`
        : `${matches.size} of ${count(all, 'batch', 'batches')}, on ${shelves} of ${count(shelved.length, 'shelf', 'shelves')}. The rest is pale.`}
    </p>
  );
}
