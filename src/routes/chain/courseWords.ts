import type { Interval } from '#shared/rules/answer.ts';

/** "3.5 ×": a multiple of the need; two digits are as many as an estimate bears. */
export const timesText = (ratio: number): string =>
  `${ratio >= 10 ? ratio.toFixed(0) : Number(ratio.toPrecision(2))} ×`;

/** "184 billion": a number of cells; they are known to a factor. */
export const cellsText = (cells: number): string => `${billions(cells)} billion`;

/** "102 to 331 billion". */
export const cellsSpan = ({ low, high }: Interval): string =>
  `${billions(low)} to ${billions(high)} billion`;

const billions = (cells: number): string => String(Number((cells / 1e9).toPrecision(3)));
