/**
 * Boards that are tried out by the thousand are read as plain numbers: batches, chains and vessels
 * by their number, days counted from 1 January 1970.
 */

/** No batch, chain, vessel or day. */
export const NONE = -1_000_000_000;

/** A figure of a row; `NONE` outside it. */
export const at = (row: Int32Array, number: number): number => row[number] ?? NONE;

export const column = (length: number): Int32Array => new Int32Array(length).fill(NONE);
