import { useEffect } from 'react';

/** Title of the page in the browser's tab and history. */
export function useTitle(title: string) {
  useEffect(() => {
    document.title = title === 'Barmkin' ? title : `${title} · Barmkin`;
  }, [title]);
}
