import { useEffect, useState, useSyncExternalStore } from 'react';
import { isUnsaved } from '../app/unsaved.ts';
import { Button } from '../components/ui/Button.tsx';
import { releaseStore } from './releaseStore.ts';

/** Asks whether a newer release may come in. A form that is open is never loaded away. */
export function NewRelease() {
  const isReady = useSyncExternalStore(releaseStore.subscribe, releaseStore.isReady);
  const [isPutOff, putOff] = useState(false);
  const [isHeld, setHeld] = useState(false);
  useRegistered();
  if (!isReady || isPutOff) return null;
  const take = () => {
    if (isUnsaved()) setHeld(true);
    else releaseStore.take();
  };
  return (
    <section
      aria-label="New version"
      className="flex flex-wrap items-center justify-center gap-x-4 gap-y-2 bg-bottle-l px-7 py-2 text-ink max-tablet:px-4 print:hidden"
    >
      <p role="status">
        {isHeld
          ? 'Something you typed is not saved. Save it or put it away, then take the new version.'
          : 'A new version of Barmkin is here.'}
      </p>
      <div className="flex gap-2">
        <Button look="first" size="small" onClick={take}>
          Use it now
        </Button>
        <Button look="quiet" size="small" onClick={() => putOff(true)}>
          Later
        </Button>
      </div>
    </section>
  );
}

/** Once the page itself is there: the worker loads every other page for later. */
function useRegistered() {
  useEffect(() => {
    const register = async () => {
      const { registerWorker } = await import('./registerWorker.ts');
      await registerWorker();
    };
    // Where the connection is gone by then, the next visit will do.
    const timer = window.setTimeout(() => void register().catch(() => undefined), 2_000);
    return () => window.clearTimeout(timer);
  }, []);
}
