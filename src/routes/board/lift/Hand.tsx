import { useImperativeHandle, useRef, type RefObject } from 'react';
import { followPress } from './followPress.ts';
import { glide, leaveBehind } from './glide.ts';
import { useLiftMachine, type LiftMachine } from './liftContext.ts';
import { LiftedCard } from './LiftedCard.tsx';
import { atPointer, type Point } from './pointer.ts';
import { watchPointer, type Watch } from './watchPointer.ts';

/** Takes hold of the batch that was pressed. */
export type Grab = (event: PointerEvent) => void;

/**
 * The pointer's drag and the carried card. A step of the pointer writes the card's transform and
 * draws nothing anew; only a gap that is reached or left is.
 */
export function Hand({ grab }: { grab: RefObject<Grab | null> }) {
  const machine = useLiftMachine();
  const card = useRef<HTMLDivElement>(null);
  useImperativeHandle(grab, () => createGrab(machine, card), [machine]);
  return (
    <div ref={card} className="pointer-events-none fixed top-0 left-0 z-[999] cursor-grabbing">
      <LiftedCard />
    </div>
  );
}

function createGrab(machine: LiftMachine, card: RefObject<HTMLDivElement | null>): Grab {
  const { lifting, store, putting } = machine;
  const carry = (at: Point) => {
    if (card.current) card.current.style.transform = atPointer(at);
  };
  const nextFrame = (run: () => void) => requestAnimationFrame(run);

  /** Ends the drag; the card glides from the pointer to where the batch stands then. */
  const letGo = (batchId: string | undefined, release: () => void, ready: () => () => void) => {
    const picture = leaveBehind(card.current);
    release();
    // The hand opens in this frame. The board is worked out after it, drawn after that, and laid out
    // in the next: all at once would be felt.
    nextFrame(() =>
      setTimeout(() => {
        const put = ready();
        setTimeout(() => {
          put();
          nextFrame(() => nextFrame(() => glide(picture, batchId ?? '')));
        });
      }),
    );
  };

  return (event) => {
    let watch: Watch | null = null;
    const putBack = () => letGo(store.get().lifted?.batchId, lifting.cancel, () => () => {});
    followPress(event, {
      lift(at) {
        // Without it the browser would look through the whole board at every step of the pointer.
        card.current?.setPointerCapture(event.pointerId);
        lifting.liftPressed();
        const opened = () => store.get().opened;
        watch = watchPointer(at, { carry, goOver: lifting.goOver, opened });
      },
      moved: (step) => watch?.moved(step),
      drop() {
        const key = watch?.stop() ?? null;
        const { lifted } = store.get();
        const gap = key === null ? undefined : lifted?.gaps.get(key);
        if (!lifted || !gap) return putBack();
        const { batchId, chainId: from } = lifted;
        letGo(batchId, lifting.release, () => putting.ready(batchId, gap, { from }));
      },
      cancel() {
        watch?.stop();
        putBack();
      },
    });
  };
}
