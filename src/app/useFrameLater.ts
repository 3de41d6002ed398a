import { startTransition, useEffect, useState } from 'react';

/** A value one frame after it is drawn elsewhere, so that the two are not drawn in one frame. */
export function useFrameLater<T>(value: T): T {
  const [shown, setShown] = useState(value);
  useEffect(() => {
    // The callback runs ahead of the frame that draws it elsewhere; what it starts is drawn after that one.
    const frame = requestAnimationFrame(() => startTransition(() => setShown(() => value)));
    return () => cancelAnimationFrame(frame);
  }, [value]);
  return shown;
}
