/** The nearest-rank percentile of some figures; not a number where there are none. */
export function percentile(figures: readonly number[], share: number): number {
  const sorted = figures.toSorted((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(sorted.length * share) - 1)] ?? Number.NaN;
}
