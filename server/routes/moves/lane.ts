/**
 * Wishes for one thing, granted one group after the other: whatever comes in while a group is at
 * work waits and becomes the next one. A group that fails is taken apart, and each of its wishes
 * tried alone, so that nobody's fails for another's sake.
 */
export interface Lane<Wish, Answer> {
  add(wish: Wish): Promise<Answer>;
  isEmpty(): boolean;
}

/** What became of one wish: its answer, or why it was refused. */
export type Outcome<Answer> = { answer: Answer } | { refusal: unknown };

interface Waiting<Wish, Answer> {
  wish: Wish;
  resolve(answer: Answer): void;
  reject(refusal: unknown): void;
}

export interface LaneWork<Wish, Answer> {
  /** Makes all of them in order, or none; an outcome for each. */
  grant(group: readonly Wish[]): Promise<Outcome<Answer>[]>;
  /** Whether a wish may be made together with those before it. */
  goesWith(wish: Wish, group: readonly Wish[]): boolean;
}

export function createLane<Wish, Answer>(work: LaneWork<Wish, Answer>): Lane<Wish, Answer> {
  let waiting: Waiting<Wish, Answer>[] = [];
  let isWorking = false;

  const grant = async (group: readonly Waiting<Wish, Answer>[]): Promise<void> => {
    try {
      const outcomes = await work.grant(group.map(({ wish }) => wish));
      for (const [at, one] of group.entries()) settle(one, outcomes[at]);
    } catch (error) {
      if (group.length === 1) group[0]?.reject(error);
      else for (const one of group) await grant([one]);
    }
  };

  const start = async (): Promise<void> => {
    isWorking = true;
    while (waiting.length > 0) {
      const group = firstGroup(waiting, work.goesWith);
      waiting = waiting.slice(group.length);
      await grant(group);
    }
    isWorking = false;
  };

  return {
    add: (wish) =>
      new Promise((resolve, reject) => {
        waiting.push({ wish, resolve, reject });
        if (!isWorking) void start();
      }),
    isEmpty: () => !isWorking && waiting.length === 0,
  };
}

function settle<Answer>(one: Waiting<unknown, Answer>, outcome: Outcome<Answer> | undefined): void {
  if (outcome === undefined) one.reject(new Error('A wish was left without an outcome'));
  else if ('answer' in outcome) one.resolve(outcome.answer);
  else one.reject(outcome.refusal);
}

function firstGroup<W extends { wish: unknown }>(
  waiting: readonly W[],
  goesWith: (wish: W['wish'], group: readonly W['wish'][]) => boolean,
): W[] {
  const end = waiting.findIndex(
    ({ wish }, at) =>
      at > 0 &&
      !goesWith(
        wish,
        waiting.slice(0, at).map((one) => one.wish),
      ),
  );
  return waiting.slice(0, end < 0 ? waiting.length : end);
}
