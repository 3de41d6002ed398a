import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import pg from 'pg';

export type Db = NodePgDatabase & { $client: pg.Pool };
/** What a command gets inside `db.transaction(async (tx) => …)`. */
export type Tx = Parameters<Parameters<Db['transaction']>[0]>[0];

export interface ConnectOptions {
  readonly max?: number;
  readonly slowMs?: number;
  readonly onSlow?: (query: { readonly ms: number; readonly text: string }) => void;
  /** A lost connection is replaced by the pool; unheard, the event would end the process. */
  readonly onError?: (error: Error) => void;
}

const ignore = () => {};

export function connect(url: string, options: ConnectOptions = {}): { db: Db; pool: pg.Pool } {
  const pool = new pg.Pool({
    connectionString: url,
    max: options.max ?? 10,
    pipeline: true,
    connectionTimeoutMillis: 10_000,
    statement_timeout: 15_000,
    idle_in_transaction_session_timeout: 15_000,
    types: { getTypeParser },
  });
  pool.on('error', options.onError ?? ignore);
  pool.on('connect', (client) => {
    client.on('error', options.onError ?? ignore);
    if (options.onSlow !== undefined) timeQueries(client, options.slowMs ?? 200, options.onSlow);
  });
  return { db: drizzle(pool, { casing: 'snake_case' }), pool };
}

/** A day stays the text it is: as a Date it would slip by the server's time zone. */
function getTypeParser(id: number, format?: 'text' | 'binary') {
  if (id === pg.types.builtins.DATE) return (text: string) => text;
  return format === 'binary'
    ? pg.types.getTypeParser(id, 'binary')
    : pg.types.getTypeParser(id, 'text');
}

function timeQueries(
  client: pg.PoolClient,
  slowMs: number,
  onSlow: NonNullable<ConnectOptions['onSlow']>,
) {
  client.query = new Proxy(client.query, {
    apply(query, self, args: unknown[]) {
      const started = performance.now();
      const result: unknown = Reflect.apply(query, self, args);
      const note = () => {
        const ms = performance.now() - started;
        if (ms >= slowMs) onSlow({ ms: Math.round(ms), text: textOf(args[0]) });
      };
      if (result instanceof Promise) result.then(note, note);
      return result;
    },
  });
}

/** The statement without its values. */
function textOf(query: unknown): string {
  const text = typeof query === 'object' && query !== null && 'text' in query ? query.text : query;
  return String(text).slice(0, 500);
}
