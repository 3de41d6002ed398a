import { useId, type ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useBoard } from '../../api/board.ts';
import { fieldClass } from '../../components/form/fieldClass.ts';
import { Button } from '../../components/ui/Button.tsx';
import { filterOf, isFiltered, type FilterName } from './filter.ts';

/** By whom, of what and when; it stands in the address, so that it can be passed on. */
export function Filters() {
  const { members, batches, chains } = useBoard();
  const [params, setParams] = useSearchParams();
  const filter = filterOf(params);
  const choose = (name: FilterName, value: string) => {
    const next = new URLSearchParams(params);
    if (value === '') next.delete(name);
    else next.set(name, value);
    setParams(next, { replace: true });
  };
  const people = members.map(({ personId, name }) => ({ id: personId, name }));
  const named = (rows: readonly { id: string; name: string }[]) =>
    rows.toSorted((a, b) => a.name.localeCompare(b.name, 'en-GB'));
  return (
    <search
      aria-label="Filter the record"
      className="mb-7 grid grid-cols-2 items-end gap-x-4 gap-y-3 tablet:grid-cols-3 wide:grid-cols-[repeat(5,minmax(0,1fr))_auto]"
    >
      <Choice
        label="Person"
        all="Everybody"
        rows={people}
        value={filter.person}
        onChoose={(value) => choose('person', value)}
      />
      <Choice
        label="Batch"
        all="All batches"
        rows={named(batches)}
        value={filter.batch}
        onChoose={(value) => choose('batch', value)}
      />
      <Choice
        label="Shelf"
        all="All shelves"
        rows={chains}
        value={filter.chain}
        onChoose={(value) => choose('chain', value)}
      />
      <DayChoice label="From" value={filter.from} onChoose={(value) => choose('from', value)} />
      <DayChoice label="To" value={filter.to} onChoose={(value) => choose('to', value)} />
      {isFiltered(filter) && (
        <Button look="quiet" onClick={() => setParams({}, { replace: true })}>
          Show all
        </Button>
      )}
    </search>
  );
}

interface ChoiceProps {
  label: string;
  /** The choice of none in particular. */
  all: string;
  rows: readonly { id: string; name: string }[];
  value: string | undefined;
  onChoose: (value: string) => void;
}

function Choice({ label, all, rows, value = '', onChoose }: ChoiceProps) {
  const isKnown = value === '' || rows.some(({ id }) => id === value);
  return (
    <Labelled label={label}>
      {(id) => (
        <select
          id={id}
          value={value}
          onChange={(event) => onChoose(event.target.value)}
          className={fieldClass(false)}
        >
          <option value="">{all}</option>
          {!isKnown && <option value={value}>One that is gone</option>}
          {rows.map((row) => (
            <option key={row.id} value={row.id}>
              {row.name}
            </option>
          ))}
        </select>
      )}
    </Labelled>
  );
}

function DayChoice({
  label,
  value = '',
  onChoose,
}: Pick<ChoiceProps, 'label' | 'value' | 'onChoose'>) {
  return (
    <Labelled label={label}>
      {(id) => (
        <input
          id={id}
          type="date"
          min="1900-01-01"
          max="2199-12-31"
          value={value}
          onChange={(event) => onChoose(event.target.value)}
          className={fieldClass(false)}
        />
      )}
    </Labelled>
  );
}

function Labelled({ label, children }: { label: string; children: (id: string) => ReactNode }) {
  const id = useId();
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      {children(id)}
    </div>
  );
}
