/** Why a change cannot be taken back. */
export interface Refused {
  ok: false;
  /** A sentence for the person who asked. */
  detail: string;
  /** The row that somebody changed since. */
  touched: string | null;
}

export const refuse = (detail: string, touched: string | null): Refused => ({
  ok: false,
  detail,
  touched,
});
