import { Bell, BellOff } from 'lucide-react';
import { useEffect, useRef, useState } from 'react';
import { Button } from '../../../components/ui/Button.tsx';
import { usePourView } from '../pourView.ts';
import { signal, wakeSound } from './signal.ts';

/** Sound and vibration when the wort should be ready, if wanted. */
export function ReadySignal() {
  const { standing, now } = usePourView();
  const [wanted, setWanted] = useState(false);
  const { ready, verdict } = standing.wort;
  const isReady = verdict === 'pour' || (ready !== null && ready.at <= now);
  const told = useRef(isReady);
  useEffect(() => {
    if (isReady && !told.current && wanted) signal();
    told.current = isReady;
  }, [isReady, wanted]);
  return (
    <Button
      look="quiet"
      className="mt-3"
      aria-pressed={wanted}
      onClick={() => {
        if (!wanted) wakeSound();
        setWanted(!wanted);
      }}
    >
      {wanted ? <Bell size={18} aria-hidden /> : <BellOff size={18} aria-hidden />}
      {wanted ? 'Calls when ready' : 'Call me when ready'}
    </Button>
  );
}
