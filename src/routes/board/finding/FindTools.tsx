import { ListFilter, Search } from 'lucide-react';
import { useSyncExternalStore } from 'react';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { createFlag } from '../../../keys/flag.ts';
import { findStore } from '../../../keys/findStore.ts';
import { useShortcut } from '../../../keys/useShortcut.ts';
import { useFilter } from './useFilter.ts';

const FilterRow = lazyPart(async () => (await import('./FilterRow.tsx')).FilterRow);

const TOOL =
  'flex min-h-9 items-center gap-1.5 rounded-button px-2.5 text-body font-semibold text-ink2 hover:bg-line2 hover:text-ink aria-expanded:bg-bottle-l aria-expanded:text-bottle max-tablet:min-h-11';

/** Whether the filter is open though nothing is chosen in it. */
const askedFor = createFlag();

function useFilterOpen() {
  const { isOn, clear } = useFilter();
  const isAsked = useSyncExternalStore(askedFor.subscribe, askedFor.get);
  const close = () => {
    if (isOn) clear();
    askedFor.set(false);
  };
  return { isOpen: isAsked || isOn, open: () => askedFor.set(true), close };
}

/** Looks for something by its name, or looks at a part of the board. */
export function FindTools() {
  const { isOpen, open, close } = useFilterOpen();
  useShortcut('filter', open);
  useShortcut('show-all', close);
  return (
    <div className="flex items-center gap-1">
      <button
        type="button"
        aria-haspopup="dialog"
        onClick={() => findStore.set(true)}
        className={TOOL}
      >
        <Search size={16} aria-hidden />
        Find
      </button>
      <button type="button" aria-expanded={isOpen} onClick={isOpen ? close : open} className={TOOL}>
        <ListFilter size={16} aria-hidden />
        Filter
      </button>
    </div>
  );
}

/** The filter, where it is open; choosing in it is in the address, so it opens with that. */
export function FilterPart() {
  return useFilterOpen().isOpen ? <FilterRow /> : null;
}
