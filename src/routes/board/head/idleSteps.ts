/** A step begins only where the page has this much to spare, ms; a step of a full board takes it. */
const STEP_MS = 8;

/** A moment is left early, ms: who presses something in it waits for its end. */
const LONGEST_MS = 28;

/** Where a browser does not tell of idle moments: one step, then a pause for the page. */
const PAUSE_MS = 16;

/**
 * Takes short steps in moments that the page has to spare, and tells the answer. Gives back how to
 * stop it, after which nothing is told. While the page is in use in earnest no step is taken.
 */
export function stepWhenIdle<T>(
  steps: Iterator<void, T, void>,
  tell: (answer: T) => void,
  isInUse: () => boolean = () => false,
): () => void {
  let isStopped = false;
  let cancel = () => {};
  const run = (timeLeft: () => number) => {
    while (!isStopped && !isInUse() && timeLeft() >= STEP_MS) {
      const step = steps.next();
      if (step.done) return tell(step.value);
    }
    if (!isStopped) cancel = soon(run);
  };
  cancel = soon(run);
  return () => {
    isStopped = true;
    cancel();
  };
}

function soon(run: (timeLeft: () => number) => void): () => void {
  if ('requestIdleCallback' in window) {
    const handle = requestIdleCallback((deadline) => {
      const end = performance.now() + LONGEST_MS;
      run(() => Math.min(deadline.timeRemaining(), end - performance.now()));
    });
    return () => cancelIdleCallback(handle);
  }
  const spare = [STEP_MS];
  const handle = setTimeout(() => run(() => spare.pop() ?? 0), PAUSE_MS);
  return () => clearTimeout(handle);
}
