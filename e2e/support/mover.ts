import { randomUUID } from 'node:crypto';
import type { APIRequestContext } from '@playwright/test';
import { api } from '#shared/api/urls.ts';
import type { MoveRequest } from '#shared/api/move.ts';
import { expect } from './test.ts';
import { sessionCookies, type RunningServer } from './server.ts';
import type { TestBrewery } from './brewery.ts';

/** By batch id, the chain it stands on; null: the bench. */
export type Whereabouts = Map<string, string | null>;

interface Season {
  readonly server: RunningServer;
  readonly brewery: TestBrewery;
  readonly chains: readonly string[];
  readonly where: Whereabouts;
}

/** Moves one batch after the other to the head of the next row, and remembers what was answered. */
export class Mover {
  readonly #request: APIRequestContext;
  readonly #season: Season;
  answered = 0;

  constructor(request: APIRequestContext, season: Season) {
    this.#request = request;
    this.#season = season;
  }

  /** A move that keeps the three rows in motion: shelf, next shelf, bench. */
  nextWish(): MoveRequest {
    const { where, chains } = this.#season;
    const ids = [...where.keys()];
    const batchId = ids[this.answered % ids.length] ?? '';
    const now = where.get(batchId) ?? null;
    const rows = [...chains, 'bench'];
    return {
      id: randomUUID(),
      batchId,
      toChainId: rows[(rows.indexOf(now ?? 'bench') + 1) % rows.length] ?? 'bench',
      afterBatchId: null,
      expectedChainId: now,
      dates: 'pull',
    };
  }

  /** False where no answer came. */
  async send(wish: MoveRequest): Promise<boolean> {
    const { server, brewery, where } = this.#season;
    const cookies = sessionCookies(server, brewery.members['head-brewer'].token);
    const cookie = cookies.map(({ name, value }) => `${name}=${value}`).join('; ');
    const answer = await this.#request
      .post(api.moves(brewery.slug), { headers: { cookie, origin: server.url }, data: wish })
      .catch(() => null);
    if (answer === null) return false;
    expect(answer.status(), await answer.text()).toBe(200);
    where.set(wish.batchId, wish.toChainId === 'bench' ? null : wish.toChainId);
    this.answered += 1;
    return true;
  }
}
