import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { filterOf, filterParams, isOff, type Filter } from './filter.ts';

/** The filter in the address, and the ways to change it. What stands open beside it stays open. */
export function useFilter() {
  const [params, setParams] = useSearchParams();
  const filter = useMemo(() => filterOf(params), [params]);
  const choose = useCallback(
    (key: keyof Filter, value: string | null) =>
      setParams(
        (now) => {
          const next = new URLSearchParams(now);
          if (value === null) next.delete(key);
          else next.set(key, value);
          return next;
        },
        { replace: true, preventScrollReset: true },
      ),
    [setParams],
  );
  const clear = useCallback(
    () =>
      setParams(
        (now) => {
          const next = new URLSearchParams(now);
          for (const key of Object.keys(filterParams(now))) next.delete(key);
          return next;
        },
        { replace: true, preventScrollReset: true },
      ),
    [setParams],
  );
  return { filter, isOn: !isOff(filter), choose, clear };
}
