import { hashKey, type QueryClient, type QueryKey } from '@tanstack/react-query';
import type { BatchRecord } from '#shared/api/reading.ts';
import { isRecord } from '../app/isRecord.ts';
import type { Entry } from '../outbox/entry.ts';
import { withTaken } from './recordWaiting.ts';

/** An entry that the server took, what it answered (undefined: not known here), and who wrote it. */
interface Taken {
  entry: Entry;
  answer: unknown;
  name: string;
}

/**
 * Lays what the server took into one of the queries whose answer it changes, so that nothing vanishes
 * between the outbox and the next read.
 * @returns whether nothing is left to be asked at once; the board's next revision brings the rest
 */
export function layIn(client: QueryClient, key: QueryKey, taken: Taken): boolean {
  const isLaid = isAnswered(client, key, taken) || isRecorded(client, key, taken);
  // A read that began before the server took it would put everything back as it was.
  return isLaid && client.isFetching({ queryKey: key }) === 0;
}

function isAnswered(client: QueryClient, key: QueryKey, { entry, answer }: Taken): boolean {
  if (!entry.answers || hashKey(entry.answers) !== hashKey(key) || answer === undefined)
    return false;
  client.setQueryData(key, answer);
  return true;
}

function isRecorded(client: QueryClient, key: QueryKey, { entry, answer, name }: Taken): boolean {
  const [what, slug, batchId] = key;
  if (what !== 'batch-record' || typeof slug !== 'string' || typeof batchId !== 'string')
    return false;
  const record = client.getQueryData<BatchRecord>(key);
  if (!record) return false;
  const me = { personId: entry.personId, name };
  client.setQueryData(key, withTaken(record, entry, answer, { slug, batchId, me }));
  return entry.method === 'DELETE' || isRecord(answer);
}
