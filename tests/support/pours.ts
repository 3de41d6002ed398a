import { randomUUID } from 'node:crypto';
import { pourState, type PourRun } from '#shared/api/pour.ts';
import { api } from '#shared/api/urls.ts';
import { batchOf, good, shelve, type TestSeason } from './season.ts';
import type { TestClock } from './clock.ts';
import type { Reply, Visitor } from './visitor.ts';

/** A pour under test: a racked blonde, a pale ale to go onto its cake, and hands to work on it. */
export interface TestPour {
  slug: string;
  /** The batch that is poured, and the one whose cake it goes onto. */
  batchId: string;
  cakeBatchId: string;
  runId: string;
}

export const runIn = (body: unknown): PourRun => {
  const { run } = pourState.parse(body);
  if (!run) throw new Error('There is no run');
  return run;
};

const at = (clock: TestClock) => ({
  deviceAt: clock.now().toISOString(),
  clockOffsetMs: 0,
});

export async function racked(
  season: TestSeason,
  clock: TestClock,
  change: { first?: object; second?: object } = {},
): Promise<Omit<TestPour, 'runId'>> {
  const { head, slug } = season;
  const today = clock.now().toISOString().slice(0, 10);
  const [first = '', second = ''] = await shelve(season, season.chainA, [
    { name: 'Jetty Pale', brewOn: '2027-03-20', ...change.first },
    { name: 'Breakwater', og: 1.052, fg: 1.013, srm: 7, ibu: 38, ...change.second },
    { name: 'Groyne', og: 1.054, fg: 1.013, srm: 8, ibu: 40 },
  ]);
  const stage = async (body: object) => {
    const { version } = await batchOf(head, slug, first);
    await good(head.post(api.batchStage(slug, first), body, version));
  };
  await stage({ stage: 'fermenting', brewedOn: '2027-03-20', volumeL: 23, og: 1.044 });
  await stage({ stage: 'racked', rackedOn: today, volumeL: 22, fg: 1.011 });
  return { slug, batchId: second, cakeBatchId: first };
}

export async function opened(visitor: Visitor, pour: Omit<TestPour, 'runId'>): Promise<TestPour> {
  const runId = randomUUID();
  await good(visitor.post(api.pour(pour.slug, pour.batchId), { id: runId }));
  return { ...pour, runId };
}

/** What somebody does with a run; each answers as the server does. */
export function hand(visitor: Visitor, { slug, batchId, runId }: TestPour, clock: TestClock) {
  const post = (url: string, body: object): Promise<Reply> => visitor.post(url, { runId, ...body });
  return {
    state: () => good(visitor.get(api.pour(slug, batchId))).then(runIn),
    step: (step: string, found: object = {}) => post(api.pourStep(slug, batchId), { step, found }),
    read: (c: number, change: object = {}) =>
      post(api.pourReadings(slug, batchId), {
        id: randomUUID(),
        c,
        typed: {},
        ...at(clock),
        ...change,
      }),
    withdraw: (readingId: string) => post(api.pourWithdrawals(slug, batchId), { readingId }),
    ask: (reason: string | null = null, id: string = randomUUID()) =>
      post(api.pourOverrides(slug, batchId), { id, reason }),
    answer: (clearanceId: string, answer: 'granted' | 'refused', reason = 'It will be fine') =>
      post(api.pourAnswers(slug, batchId), { clearanceId, answer, reason }),
    pour: (change: object = {}) =>
      post(api.pourDone(slug, batchId), {
        id: randomUUID(),
        ...at(clock),
        volumeL: 22.5,
        og: 1.053,
        typed: {},
        surplus: null,
        ...change,
      }),
    sign: (reason: string) => post(api.pourSignature(slug, batchId), { reason }),
    takeOver: () => post(api.pourHolder(slug, batchId), {}),
    leave: () => post(api.pourLeaving(slug, batchId), {}),
  };
}
