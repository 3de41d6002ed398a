/** One event of a Chromium trace; times in microseconds. */
interface TraceEvent {
  name: string;
  ph: string;
  pid: number;
  tid: number;
  ts: number;
  dur?: number;
  tdur?: number;
  args?: { name?: string };
}

/** Milliseconds of the main thread's own time, without what other programs took from it. */
export interface Timeline {
  /** Scripting, style, layout and hit tests of each frame that had any. */
  frames: number[];
  /** Each task of the event loop. */
  tasks: number[];
}

const WORK = new Set([
  'EvaluateScript',
  'EventDispatch',
  'FireAnimationFrame',
  'FireIdleCallback',
  'FunctionCall',
  'HitTest',
  'Layout',
  'MajorGC',
  'MinorGC',
  'RunMicrotasks',
  'TimerFire',
  'UpdateLayoutTree',
  'v8.run',
]);

export const CATEGORIES = ['devtools.timeline', 'disabled-by-default-devtools.timeline', 'v8'];

/** Reads a trace: what the page's main thread did, frame by frame and task by task. */
export function readTrace(json: string): Timeline {
  const { traceEvents } = JSON.parse(json) as { traceEvents: TraceEvent[] };
  const events = ofMainThread(traceEvents).toSorted((a, b) => a.ts - b.ts);
  const tasks = events.filter(({ name }) => name === 'RunTask').map(ownTime);
  const commits = events.filter(({ name }) => name === 'Commit').map(({ ts }) => ts);
  if (tasks.length === 0 || commits.length < 10) throw new Error('the trace shows no drag');
  return { frames: framesOf(outermost(events), commits), tasks };
}

const ownTime = ({ tdur, dur }: TraceEvent): number => (tdur ?? dur ?? 0) / 1000;

/** Of all pages' main threads the one that did most: there is one page, and some idle helpers. */
function ofMainThread(events: readonly TraceEvent[]): TraceEvent[] {
  const threads = events.filter(
    ({ name, args }) => name === 'thread_name' && args?.name === 'CrRendererMain',
  );
  const byThread = threads.map(({ pid, tid }) =>
    events.filter((event) => event.pid === pid && event.tid === tid && event.ph === 'X'),
  );
  return byThread.toSorted((a, b) => b.length - a.length)[0] ?? [];
}

/** Work that stands in no other work, so that nothing is counted twice. */
function outermost(events: readonly TraceEvent[]): TraceEvent[] {
  let end = 0;
  return events.filter((event) => {
    if (!WORK.has(event.name) || event.ts < end) return false;
    end = event.ts + (event.dur ?? 0);
    return true;
  });
}

function framesOf(work: readonly TraceEvent[], commits: readonly number[]): number[] {
  const sums = new Map<number, number>();
  let frame = 0;
  for (const event of work) {
    while (event.ts > (commits[frame] ?? Infinity)) frame += 1;
    sums.set(frame, (sums.get(frame) ?? 0) + ownTime(event));
  }
  return [...sums.values()];
}
