import { useEffect, useRef } from 'react';

/** Marks which edges hide something; written to the element, so that scrolling draws nothing anew. */
export function useHiddenEdges() {
  const ref = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const run = ref.current;
    if (!run) return;
    const mark = () => {
      const rest = run.scrollWidth - run.clientWidth - run.scrollLeft;
      run.toggleAttribute('data-more-after', rest > 4);
      run.toggleAttribute('data-more-before', run.scrollLeft > 4);
    };
    mark();
    const observer = new ResizeObserver(mark);
    observer.observe(run);
    if (run.firstElementChild) observer.observe(run.firstElementChild);
    run.addEventListener('scroll', mark, { passive: true });
    return () => {
      observer.disconnect();
      run.removeEventListener('scroll', mark);
    };
  }, []);
  return ref;
}
