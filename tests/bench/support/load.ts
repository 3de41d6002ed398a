import autocannon from 'autocannon';
import { percentile } from './percentile.ts';

export interface Load {
  /** Full answers a second. */
  rate: number;
  /** Milliseconds until the whole answer was there. */
  p95: number;
}

interface Target {
  url: string;
  headers: Record<string, string>;
}

const WARM_S = 4;
const MEASURED_S = 10;

/** Connections that each ask again as soon as they are answered. Anything but a full 200 is a fault. */
export async function load(target: Target, connections: number): Promise<Load> {
  await fire(target, connections, WARM_S);
  return fire(target, connections, MEASURED_S);
}

async function fire(target: Target, connections: number, duration: number): Promise<Load> {
  const times: number[] = [];
  const sizes = new Set<number>();
  const run = autocannon({ ...target, connections, duration });
  run.on('response', (_client, _status, bytes, ms) => {
    times.push(ms);
    sizes.add(bytes);
  });
  const result = await run;
  const failed = result.non2xx + result.errors + result.timeouts;
  if (failed > 0 || times.length === 0) throw new Error(`${failed} requests were not answered 200`);
  const [least, most] = [Math.min(...sizes), Math.max(...sizes)];
  if (least < most * 0.98)
    throw new Error(`answers of ${least} to ${most} bytes: not all are whole`);
  return { rate: times.length / result.duration, p95: percentile(times, 0.95) };
}
