import { LIFT_PX, pointOf, type Point } from './pointer.ts';

/** What becomes of a press, in this order; `lift` at the first few pixels, then one of the others. */
export interface PressSteps {
  lift(at: Point): void;
  moved(event: PointerEvent): void;
  drop(at: Point): void;
  cancel(): void;
}

const prevent = (event: Event) => event.preventDefault();

const unselect = () => document.getSelection()?.removeAllRanges();

/** The click that a browser makes of a drag's end presses nothing. */
function swallowClick() {
  const swallow = (event: Event) => event.stopPropagation();
  document.addEventListener('click', swallow, { capture: true, once: true });
  setTimeout(() => document.removeEventListener('click', swallow, { capture: true }), 50);
}

/**
 * Follows one pointer from its press to its end. Listens on the page, not on the batch: what is
 * drawn meanwhile may take the batch's element away.
 */
export function followPress(first: PointerEvent, steps: PressSteps): void {
  const listening = new AbortController();
  const { signal } = listening;
  let isLifted = false;

  const end = (finish: () => void) => {
    listening.abort();
    if (isLifted) finish();
  };
  const cancel = () => end(steps.cancel);
  const isOwn = ({ pointerId }: PointerEvent) => pointerId === first.pointerId;

  const onMove = (event: PointerEvent) => {
    if (!isOwn(event)) return;
    if (!isLifted) {
      const way = Math.hypot(event.clientX - first.clientX, event.clientY - first.clientY);
      if (way < LIFT_PX) return;
      isLifted = true;
      unselect();
      steps.lift(pointOf(event));
    }
    if (event.cancelable) event.preventDefault();
    steps.moved(event);
  };
  const onUp = (event: PointerEvent) => {
    if (!isOwn(event)) return;
    if (isLifted) swallowClick();
    end(() => steps.drop(pointOf(event)));
  };
  const onKey = (event: KeyboardEvent) => {
    if (event.key !== 'Escape' || !isLifted) return;
    event.preventDefault();
    event.stopPropagation();
    document.addEventListener('pointerup', swallowClick, { capture: true, once: true });
    cancel();
  };

  const all = { signal, capture: true };
  document.addEventListener('pointermove', onMove, all);
  document.addEventListener('pointerup', onUp, all);
  document.addEventListener('pointercancel', (event) => isOwn(event) && cancel(), all);
  document.addEventListener('keydown', onKey, all);
  document.addEventListener('visibilitychange', cancel, all);
  document.addEventListener('selectionchange', () => isLifted && unselect(), all);
  // A finger that stays would open the system's menu, and a link would be dragged itself.
  document.addEventListener('contextmenu', prevent, all);
  document.addEventListener('dragstart', prevent, all);
  window.addEventListener('resize', cancel, { signal });
}
