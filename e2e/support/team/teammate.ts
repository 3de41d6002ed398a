import type { Page } from '@playwright/test';
import { CONTRACT, CONTRACT_HEADER } from '#shared/api/contract.ts';
import type { Chance } from './chance.ts';

/** Somebody at a browser of their own. */
export interface Teammate {
  name: string;
  /** The board, open all the time. */
  page: Page;
  /** Another tab with a chain opened; a guest has none. */
  chainPage: Page | null;
  /** Under which address what they change is changed: a guest's is another brewery's. */
  place: string;
  isGuest: boolean;
  chance: Chance;
  /** What was sent and had no answer that says whether it is done. It is sent again, as it was. */
  unanswered: Sending[];
  /** How often each deed was done, and how often it was begun in vain. */
  deeds: Map<string, { done: number; vain: number }>;
}

export interface Sending {
  method: string;
  url: string;
  body?: unknown;
  version?: number;
}

export interface Reply {
  /** 0: none came. */
  status: number;
  content: unknown;
}

/** Asks the server as the page would. */
export function ask({ page }: Teammate, sending: Sending): Promise<Reply> {
  return page.evaluate(
    async ({ method, url, body, version, contract, contractHeader }) => {
      const headers: Record<string, string> = {
        'Content-Type': 'application/json',
        [contractHeader]: contract,
      };
      if (version !== undefined) headers['If-Match'] = `"${version}"`;
      const init = { method, headers, ...(body !== undefined && { body: JSON.stringify(body) }) };
      try {
        const response = await fetch(url, init);
        return { status: response.status, content: (await response.json()) as unknown };
      } catch {
        return { status: 0, content: null };
      }
    },
    { ...sending, contract: String(CONTRACT), contractHeader: CONTRACT_HEADER },
  );
}

/** Sends something that may be sent twice and is done once; without an answer it is kept. */
export async function send(mate: Teammate, sending: Sending): Promise<Reply> {
  const reply = await ask(mate, sending);
  if (reply.status === 0 || reply.status === 503) mate.unanswered.push(sending);
  return reply;
}

/** Sends again what had no answer. Where there is none again it stays. */
export async function sendAgain(mate: Teammate): Promise<Reply[]> {
  const again = mate.unanswered.splice(0);
  const replies: Reply[] = [];
  for (const sending of again) replies.push(await send(mate, sending));
  return replies;
}
