import { useQuery } from '@tanstack/react-query';
import clsx from 'clsx';
import { useEffect, useId, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { indexBoard } from '#shared/chain/board.ts';
import { boardQuery } from '../../api/board.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { fieldClass } from '../../components/form/fieldClass.ts';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { filterParams } from '../board/finding/filter.ts';
import { count } from '../board/view/words.ts';
import { findByName, namedOn, type Found } from './findByName.ts';

/** More are counted, not listed. */
const LISTED = 40;

/** Type a name, go along what has it with the arrows, Enter goes there. */
export function FindDialog({ onClose }: { onClose: () => void }) {
  const { slug } = useBrewery();
  const { data: board } = useQuery(boardQuery(slug));
  const all = useMemo(() => (board ? namedOn(indexBoard(board)) : []), [board]);
  const go = useGoTo();
  return (
    <Dialog
      open
      onClose={onClose}
      title="Find"
      lead={board ? `A batch or a shelf of ${board.season.name}.` : 'A batch or a shelf.'}
    >
      <Finder
        all={all}
        onChoose={(found) => {
          onClose();
          go(found);
        }}
      />
    </Dialog>
  );
}

/** The board, with what was found in sight and under the focus. */
function useGoTo() {
  const { path } = useBrewery();
  const { pathname, search } = useLocation();
  const navigate = useNavigate();
  return ({ id }: Found) => {
    const isThere = pathname === path();
    const kept = isThere ? filterParams(new URLSearchParams(search)) : {};
    const params = new URLSearchParams({ ...kept, at: id });
    void navigate(`${path()}?${params.toString()}`, { replace: isThere, preventScrollReset: true });
  };
}

interface FinderProps {
  all: readonly Found[];
  onChoose: (found: Found) => void;
}

function Finder({ all, onChoose }: FinderProps) {
  const id = useId();
  const [text, setText] = useState('');
  const [at, setAt] = useState(0);
  const input = useRef<HTMLInputElement>(null);
  const found = useMemo(() => findByName(all, text), [all, text]);
  const shown = found.slice(0, LISTED);
  const chosen = Math.min(at, shown.length - 1);
  const optionId = (place: number) => `${id}-${place}`;
  useEffect(() => input.current?.focus(), []);
  useEffect(() => {
    document.getElementById(`${id}-${chosen}`)?.scrollIntoView({ block: 'nearest' });
  }, [id, chosen]);
  const onKeyDown = (event: KeyboardEvent) => {
    const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    const one = shown[chosen];
    if (step !== undefined && shown.length > 0)
      setAt((chosen + step + shown.length) % shown.length);
    else if (event.key === 'Enter' && one) onChoose(one);
    else return;
    event.preventDefault();
  };
  return (
    <>
      <input
        ref={input}
        type="text"
        role="combobox"
        aria-label="Name"
        aria-expanded
        aria-controls={`${id}-list`}
        aria-autocomplete="list"
        aria-activedescendant={chosen >= 0 ? optionId(chosen) : undefined}
        autoComplete="off"
        spellCheck={false}
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          setAt(0);
        }}
        onKeyDown={onKeyDown}
        className={fieldClass(false)}
      />
      <p role="status" className="mt-2 text-small text-ink2">
        {wordsFor(found.length)}
      </p>
      <div
        id={`${id}-list`}
        role="listbox"
        aria-label="Found"
        className="thumb-slim mt-1 max-h-[45dvh] overflow-y-auto"
      >
        {shown.map((each, place) => (
          <Option
            key={each.id}
            id={optionId(place)}
            found={each}
            isChosen={place === chosen}
            onChoose={() => onChoose(each)}
          />
        ))}
      </div>
    </>
  );
}

function wordsFor(found: number): string {
  if (found === 0) return 'Nothing on this board has that in its name.';
  if (found > LISTED) return `${found} have it; the first ${LISTED} are listed.`;
  return `${count(found, 'name')} found.`;
}

interface OptionProps {
  id: string;
  found: Found;
  isChosen: boolean;
  onChoose: () => void;
}

/** The keys are the field's; a click or a tap chooses too. */
const Option = ({ id, found, isChosen, onChoose }: OptionProps) => (
  <button
    type="button"
    id={id}
    role="option"
    tabIndex={-1}
    aria-selected={isChosen}
    onClick={onChoose}
    className={clsx(
      'flex min-h-10 w-full text-left items-center gap-3 rounded-lg px-3 py-1.5 max-tablet:min-h-12',
      isChosen && 'bg-bottle-l',
    )}
  >
    <span className="min-w-0 grow font-semibold wrap-anywhere">{found.name}</span>
    <span className="max-w-[45%] shrink-0 truncate text-small text-ink2">{found.where}</span>
  </button>
);
