import type { Row } from '../row.ts';
import { percentile } from './percentile.ts';

export function latencyRow(what: string, times: readonly number[], mostMs: number): Row {
  const p95 = percentile(times, 0.95);
  return {
    what,
    reach: `p95 ≤ ${mostMs} ms`,
    measured: `p50 ${percentile(times, 0.5).toFixed(0)} ms, p95 ${p95.toFixed(0)} ms`,
    holds: p95 <= mostMs,
  };
}
