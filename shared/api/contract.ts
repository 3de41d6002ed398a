/**
 * What a page and the server agreed on when the page was built. An entry that was written without
 * a connection names the contract it was written under, and may arrive long after.
 */
export const CONTRACT_HEADER = 'Barmkin-Contract';

export interface Contract {
  number: number;
  /** The day on which the next one took its place, `YYYY-MM-DD`; null: it is in force. */
  replacedOn: string | null;
}

/**
 * Every contract there was, oldest first. A change of a request that an old page could still send
 * gets a new number here, and the day in the row before; until that row is too old the server
 * takes both.
 */
export const CONTRACTS: readonly Contract[] = [{ number: 1, replacedOn: null }];

/** The one that this release speaks. */
export const CONTRACT = CONTRACTS.at(-1)?.number ?? 1;

/** So long after it was replaced a contract is still taken. */
export const CONTRACT_DAYS = 90;

const DAY_MS = 86_400_000;

/**
 * Whether what was written under a contract is still taken at an instant. One newer than all known
 * is: while a release is rolled out, a new page may meet an old server.
 * @param number a whole number from 1; anything else is none
 */
export function isContractTaken(
  number: number,
  now: Date,
  contracts: readonly Contract[] = CONTRACTS,
): boolean {
  if (!Number.isInteger(number) || number < 1) return false;
  const known = contracts.find((one) => one.number === number);
  if (!known) return number > (contracts.at(-1)?.number ?? 0);
  if (known.replacedOn === null) return true;
  return now.getTime() < Date.parse(`${known.replacedOn}T00:00:00Z`) + (CONTRACT_DAYS + 1) * DAY_MS;
}
