import type { BrowserContext, Request } from '@playwright/test';

/** A change that the server answered with success: what was asked for, and what was said. */
export interface Answered {
  method: string;
  path: string;
  body: unknown;
  answer: unknown;
}

/** Everything that was answered with success, whoever asked and however. */
export interface Ledger {
  readonly answered: readonly Answered[];
  /** How often each status was answered to a change; 0: no answer. */
  readonly statuses: ReadonlyMap<number, number>;
  watch(context: BrowserContext): void;
  /** Until every answer is read. */
  settled(): Promise<unknown>;
}

export function createLedger(): Ledger {
  const answered: Answered[] = [];
  const statuses = new Map<number, number>();
  const reading: Promise<unknown>[] = [];
  const count = (status: number) => statuses.set(status, (statuses.get(status) ?? 0) + 1);
  const isChange = (request: Request) => !['GET', 'HEAD'].includes(request.method());
  return {
    answered,
    statuses,
    watch(context) {
      context.on('requestfailed', (request) => isChange(request) && count(0));
      context.on('response', (response) => {
        const request = response.request();
        if (!isChange(request)) return;
        count(response.status());
        if (!response.ok()) return;
        const path = new URL(request.url()).pathname;
        const note = { method: request.method(), path, body: bodyOf(request) };
        // The answer itself may be lost on its way; what it answered is done all the same.
        const read = response.json().catch((): unknown => null);
        reading.push(read.then((answer: unknown) => answered.push({ ...note, answer })));
      });
    },
    settled: () => Promise.all(reading),
  };
}

function bodyOf(request: Request): unknown {
  try {
    return request.postDataJSON() as unknown;
  } catch {
    return null;
  }
}
