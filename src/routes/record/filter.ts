import { recordQuery } from '#shared/api/record.ts';
import type { RecordFilter } from '../../api/record.ts';

export const FILTERS = ['person', 'batch', 'chain', 'from', 'to'] as const;
export type FilterName = (typeof FILTERS)[number];

/** The filter that stands in the address; what cannot be one is left out. */
export function filterOf(params: URLSearchParams): RecordFilter {
  const known = FILTERS.flatMap((name) => {
    const read = recordQuery.shape[name].safeParse(params.get(name) ?? undefined);
    return read.success && read.data ? [[name, read.data] as const] : [];
  });
  return Object.fromEntries(known);
}

export const isFiltered = (filter: RecordFilter): boolean => Object.keys(filter).length > 0;
