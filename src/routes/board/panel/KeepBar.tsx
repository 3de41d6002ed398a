import { useEffect, useRef } from 'react';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import { format } from '#shared/units/quantity.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { spanWords } from './keepWords.ts';

interface KeepBarProps {
  answer: LinkAnswer;
  /** Litres that are kept. */
  kept: number;
  /** While it is dragged. Absent for those who only read. */
  onTry?: (litres: number) => void;
  /** When it is let go. */
  onKeep?: (litres: number) => void;
}

const STEPS = 100;
/** Keys step one by one; the hand has let go when they pause. */
const KEY_PAUSE_MS = 700;
const share = (part: number, whole: number) => Math.min(1, Math.max(0, part / whole));

/** The whole cake as a bar, the kept part on it, the mark where it is enough. */
export function KeepBar({ answer, kept, onTry, onKeep }: KeepBarProps) {
  const { units } = useBoardView();
  const whole = answer.cake.volumeL ?? 0;
  const enough = answer.keep.recommendedL;
  const at = enough === null ? null : share(enough, whole) * 100;
  const { volumeInterval } = answer.cake;
  const interval = volumeInterval ? ` (${spanWords(volumeInterval, units)})` : '';
  return (
    <div className="mt-1.5 text-small">
      {at !== null && enough !== null && (
        <p
          className="w-max font-bold"
          style={
            at > 55 ? { marginLeft: `${at}%`, translate: '-100% 0' } : { marginLeft: `${at}%` }
          }
        >
          {format('smallVolume', enough, units)} is enough
        </p>
      )}
      <div className="relative my-1 h-[26px]">
        <div className="absolute inset-x-0 inset-y-0.5 overflow-hidden rounded-md bg-cake inset-ring inset-ring-cake-dd">
          <div className="h-full bg-bottle-bar" style={{ width: `${share(kept, whole) * 100}%` }} />
        </div>
        {at !== null && (
          <div
            aria-hidden
            className="absolute -inset-y-1 w-0.5 bg-ink"
            style={{ left: `${at}%` }}
          />
        )}
        {onTry && onKeep && <KeepSlider whole={whole} kept={kept} onTry={onTry} onKeep={onKeep} />}
      </div>
      <p className="flex justify-between gap-3 text-ink2">
        <span>kept {format('smallVolume', kept, units)}</span>
        <span>
          whole cake {format('smallVolume', whole, units)}
          {interval}
        </span>
      </p>
    </div>
  );
}

interface KeepSliderProps {
  whole: number;
  kept: number;
  onTry: (litres: number) => void;
  onKeep: (litres: number) => void;
}

function KeepSlider({ whole, kept, onTry, onKeep }: KeepSliderProps) {
  const { units } = useBoardView();
  const pause = useRef(0);
  const keep = useRef<(() => void) | null>(null);
  const litres = (steps: string) => Math.round((Number(steps) / STEPS) * whole * 1000) / 1000;
  const done = () => {
    window.clearTimeout(pause.current);
    keep.current?.();
    keep.current = null;
  };
  // What was chosen just before the panel closes is kept too.
  useEffect(() => () => keep.current?.(), []);
  return (
    <input
      type="range"
      aria-label="Kept part of the cake"
      aria-valuetext={format('smallVolume', kept, units)}
      min={0}
      max={STEPS}
      step={1}
      value={Math.round(share(kept, whole) * STEPS)}
      onChange={(event) => {
        const next = litres(event.target.value);
        keep.current = () => onKeep(next);
        onTry(next);
      }}
      onPointerUp={done}
      onKeyUp={() => {
        window.clearTimeout(pause.current);
        pause.current = window.setTimeout(done, KEY_PAUSE_MS);
      }}
      onBlur={done}
      className="keep-slider absolute inset-0 size-full cursor-ew-resize"
    />
  );
}
