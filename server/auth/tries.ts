import { createHash } from 'node:crypto';
import type pg from 'pg';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import type { Limits, Rate } from '../settings/limits.ts';
import { problem } from '../problems.ts';

type Limited = {
  [K in keyof Limits]: Limits[K] extends Rate ? K : never;
}[keyof Limits];

export interface Tries {
  /** Counts a try; refuses it when there were too many. The parts of the key are stored as a hash. */
  count(what: Limited, ...key: string[]): Promise<void>;
  /** Takes back one counted try, because it was a good one. */
  forget(what: Limited, ...key: string[]): Promise<void>;
}

/** Counters in the database, so that several processes count together. */
export function createTries(pool: pg.Pool, limits: Limits): Tries {
  const limiters = new Map<Limited, RateLimiterPostgres>();
  const limiter = (what: Limited) => {
    const known = limiters.get(what);
    if (known) return known;
    const made = new RateLimiterPostgres({
      storeClient: pool,
      storeType: 'pool',
      tableName: 'try_count',
      tableCreated: true,
      keyPrefix: what,
      points: limits[what].points,
      duration: limits[what].seconds,
      clearExpiredByTimeout: true,
    });
    limiters.set(what, made);
    return made;
  };
  const hashed = (key: string[]) => createHash('sha256').update(key.join('\n')).digest('base64url');
  return {
    async count(what, ...key) {
      try {
        await limiter(what).consume(hashed(key));
      } catch (error) {
        if (!(error instanceof RateLimiterRes)) throw error;
        throw problem('too-many', { retryAfter: Math.ceil(error.msBeforeNext / 1000) });
      }
    },
    async forget(what, ...key) {
      await limiter(what).reward(hashed(key));
    },
  };
}
