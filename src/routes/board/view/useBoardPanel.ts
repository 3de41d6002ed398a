import { useCallback, useMemo } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { paramsNow } from '../../../app/paramsNow.ts';
import { filterParams } from '../finding/filter.ts';

export type BoardPanel =
  | { kind: 'link'; laterId: string }
  | { kind: 'batch'; batchId: string }
  /** `likeId`: a copy of that batch. */
  | { kind: 'new'; what: 'batch' | 'chain'; likeId?: string };

export function panelOf(params: URLSearchParams): BoardPanel | null {
  const laterId = params.get('link');
  if (laterId) return { kind: 'link', laterId };
  const batchId = params.get('batch');
  if (batchId) return { kind: 'batch', batchId };
  const what = params.get('new');
  if (what !== 'batch' && what !== 'chain') return null;
  const likeId = params.get('like');
  return { kind: 'new', what, ...(likeId && { likeId }) };
}

const search = (panel: BoardPanel): Record<string, string> => {
  switch (panel.kind) {
    case 'link':
      return { link: panel.laterId };
    case 'batch':
      return { batch: panel.batchId };
    case 'new':
      return { new: panel.what, ...(panel.likeId && { like: panel.likeId }) };
  }
};

/** Opens something beside the shelves. Who only opens is not drawn anew when the address changes. */
export function useOpenPanel(): (next: BoardPanel) => void {
  const navigate = useNavigate();
  return useCallback(
    (next) => {
      const params = paramsNow();
      const opened = new URLSearchParams({ ...filterParams(params), ...search(next) });
      const isOpen = panelOf(params) !== null;
      void navigate(`?${opened}`, { replace: isOpen, preventScrollReset: true });
    },
    [navigate],
  );
}

/**
 * What stands open beside the shelves lives in the address: it can be linked to and the browser's
 * back closes it. Another panel takes the place of the one that is open.
 */
export function useBoardPanel() {
  const [params, setParams] = useSearchParams();
  const panel = useMemo(() => panelOf(params), [params]);
  const open = useOpenPanel();
  const close = useCallback(
    () => setParams(filterParams(paramsNow()), { replace: true, preventScrollReset: true }),
    [setParams],
  );
  return { panel, open, close };
}
