import type { QueryKey } from '@tanstack/react-query';

/** Something that was written on this device and that the server has not confirmed yet. */
export interface Entry {
  /** Made here; where the entry makes a row, the row's id, so that it is made once. */
  id: string;
  personId: string;
  /** Under which it was written. */
  contract: number;
  /** By this device's clock, ISO 8601. */
  madeAt: string;
  method: 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  url: string;
  body?: unknown;
  /** Version of the row that this was made from. */
  ifMatch?: number;
  /** In words: "Gravity 1.012 of Ebb Pale". */
  what: string;
  /** Address of the page it was written on. */
  page: string;
  /** Queries whose answer it changes. */
  touches: QueryKey[];
  /** The one of them whose data the server's answer is, where it is a whole one. */
  answers?: QueryKey;
  /** Why the server did not take it; null: it has not been asked, or gave no answer. */
  refusal: Refusal | null;
}

/** The server's no. The entry stays, and what was written after it waits behind it. */
export interface Refusal {
  status: number;
  /** Of the problem's catalogue; null: unknown here. */
  kind: string | null;
  sentence: string;
  /** At single fields. */
  errors: { detail: string; pointer: string }[];
  /** On a conflict: the row as it is now. */
  current?: unknown;
}

/** What came of sending an entry. */
export type Outcome =
  | { kind: 'done'; answer: unknown }
  /** No answer: whether it arrived is not known. It is sent again, and done once. */
  | { kind: 'lost' }
  /** The server asks to wait, or to sign in again. */
  | { kind: 'later' }
  | { kind: 'refused'; refusal: Refusal };
