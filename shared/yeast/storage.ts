/**
 * Loss of living cells while a cake waits.
 *
 * Exponential decay fitted to the four losses that McCaig & Bendiak published (MBAA TQ 22(4), 1985:
 * one brewery's lager slurry, three temperatures, five and six days). Nothing beyond a week is data:
 * the half-life may be 2.5 times shorter to 10 times longer in the cold, half to three times when
 * warm.
 */
export const LN_RATE_AT_0C = -4.319;
export const LN_RATE_PER_C = 0.107;

/** Loss of living cells at a temperature in °C, per day. */
export const lossRate = (celsius: number): number =>
  Math.exp(LN_RATE_AT_0C + LN_RATE_PER_C * celsius);

/** Share of living cells left, 0–1, after `days` (below 0 counts as 0) at a temperature in °C. */
export const survival = (days: number, celsius: number): number =>
  Math.exp(-lossRate(celsius) * Math.max(0, days));

const WARM_FROM_C = 10;

/** Within what the share may lie: the uncertainty of the half-life, chosen to cover what is published. */
export function survivalRange(days: number, celsius: number): { low: number; high: number } {
  const [shorter, longer] = celsius >= WARM_FROM_C ? [2, 3] : [2.5, 10];
  return { low: survival(days * shorter, celsius), high: survival(days / longer, celsius) };
}
