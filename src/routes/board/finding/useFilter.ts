import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { paramsNow } from '../../../app/paramsNow.ts';
import { filterOf, filterParams, isOff, type Filter } from './filter.ts';

const STAY = { replace: true, preventScrollReset: true } as const;

/** The filter in the address, and the ways to change it. What stands open beside it stays open. */
export function useFilter() {
  const [params, setParams] = useSearchParams();
  const filter = useMemo(() => filterOf(params), [params]);
  const choose = useCallback(
    (key: keyof Filter, value: string | null) => {
      const next = paramsNow();
      if (value === null) next.delete(key);
      else next.set(key, value);
      setParams(next, STAY);
    },
    [setParams],
  );
  const clear = useCallback(() => {
    const next = paramsNow();
    for (const key of Object.keys(filterParams(next))) next.delete(key);
    setParams(next, STAY);
  }, [setParams]);
  return { filter, isOn: !isOff(filter), choose, clear };
}
