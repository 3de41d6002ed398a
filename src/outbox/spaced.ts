/**
 * Runs work at once, but not again within so long: what asks for it meanwhile is served together at
 * the end of that time. `stop` calls off what is still to come.
 */
export function spaced(ms: number, work: () => void): { ask(): void; stop(): void } {
  let rest: ReturnType<typeof setTimeout> | null = null;
  let isAsked = false;
  const run = () => {
    isAsked = false;
    rest = setTimeout(() => {
      rest = null;
      if (isAsked) run();
    }, ms);
    work();
  };
  return {
    ask() {
      if (rest === null) run();
      else isAsked = true;
    },
    stop() {
      if (rest !== null) clearTimeout(rest);
      rest = null;
      isAsked = false;
    },
  };
}
