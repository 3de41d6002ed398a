import {
  pourOpening,
  pourRequest,
  pourStepRequest,
  withdrawalRequest,
  wortReadingRequest,
  type PourPerson,
  type PourRequest,
  type PourRun,
  type PourState,
  type WortReadingRequest,
} from '#shared/api/pour.ts';
import { api } from '#shared/api/urls.ts';
import { leaveAt } from '#shared/pour/leave.ts';
import { pathOf, type Entries } from '../outbox/queue.ts';

interface Where {
  slug: string;
  batchId: string;
  /** Whose cake it would go onto now; null: fresh yeast. */
  cakeBatchId: string | null;
  me: PourPerson;
}

/** Entries of the outbox that belong to one batch's pour. */
export const ofPour = (
  entries: Entries,
  { slug, batchId }: Pick<Where, 'slug' | 'batchId'>,
): Entries => entries.filter(({ url }) => url.startsWith(pathOf(api.pour(slug, batchId))));

/**
 * The pour as it will stand once everything that waits has arrived. What the server would say of a
 * pour is not foretold, but for the leave that it gave before.
 */
export function withWaiting(state: PourState, entries: Entries, where: Where): PourState {
  const run = ofPour(entries, where).reduce<PourRun | null>(
    (standing, { url, body, madeAt }) => after(standing, url, body, madeAt, where),
    state.run,
  );
  return run === state.run ? state : { ...state, run };
}

function after(
  run: PourRun | null,
  url: string,
  body: unknown,
  madeAt: string,
  where: Where,
): PourRun | null {
  const { slug, batchId, me } = where;
  const path = pathOf(url);
  if (path === pathOf(api.pour(slug, batchId))) return opened(run, body, madeAt, where);
  if (!run) return null;
  switch (path) {
    case pathOf(api.pourStep(slug, batchId)): {
      const { step, found } = pourStepRequest.parse(body);
      return { ...run, step, found: { ...run.found, ...found } };
    }
    case pathOf(api.pourReadings(slug, batchId)):
      return withReading(run, wortReadingRequest.parse(body), me);
    case pathOf(api.pourWithdrawals(slug, batchId)): {
      const { readingId } = withdrawalRequest.parse(body);
      const readings = run.readings.map((one) =>
        one.id === readingId ? { ...one, withdrawn: true } : one,
      );
      return { ...run, readings };
    }
    case pathOf(api.pourDone(slug, batchId)):
      return poured(run, pourRequest.parse(body), me);
    case pathOf(api.pourLeaving(slug, batchId)):
      return { ...run, state: 'left', closedAt: madeAt };
    default:
      return run;
  }
}

function opened(run: PourRun | null, body: unknown, madeAt: string, where: Where): PourRun | null {
  const { id } = pourOpening.parse(body);
  if (run?.id === id || run?.state === 'open') return run;
  const { batchId, cakeBatchId, me } = where;
  return {
    id,
    batchId,
    cakeBatchId,
    heldBy: me,
    openedAt: madeAt,
    closedAt: null,
    state: 'open',
    step: cakeBatchId === null ? 'clean' : 'racked',
    found: {},
    readings: [],
    clearances: [],
    pour: null,
  };
}

/** The device's clock put right, as the server will do it. */
function timed({ deviceAt, clockOffsetMs }: PourRequest | WortReadingRequest, by: PourPerson) {
  const at = new Date(Date.parse(deviceAt) + clockOffsetMs).toISOString();
  return { at, deviceAt, clockOffsetMs, arrivedAt: at, by };
}

function withReading(run: PourRun, body: WortReadingRequest, me: PourPerson): PourRun {
  if (run.readings.some(({ id }) => id === body.id)) return run;
  const { id, c, typed } = body;
  const reading = { id, c, typed, ...timed(body, me), withdrawn: false };
  return { ...run, readings: [...run.readings, reading] };
}

function poured(run: PourRun, body: PourRequest, me: PourPerson): PourRun {
  if (run.pour) return run;
  const time = timed(body, me);
  const cleared = leaveAt(run, Date.parse(time.at), false) !== null;
  return {
    ...run,
    state: 'poured',
    step: 'after',
    closedAt: time.at,
    pour: {
      id: body.id,
      ...time,
      volumeL: body.volumeL,
      og: body.og,
      readingC: run.readings.findLast(({ withdrawn }) => !withdrawn)?.c ?? null,
      verdict: cleared ? 'pour' : 'hold',
      findings: [],
      cleared,
      signedBy: null,
      signedAt: null,
      reason: '',
    },
  };
}
