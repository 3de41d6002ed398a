import type { z } from 'zod';
import type { Told } from '#shared/record/sentences.ts';
import type { Sayer } from '#shared/record/words.ts';
import type { Tx } from '../../db/client.ts';
import type { BoardNow } from '../board/hand.ts';

export interface Named {
  id: string;
  name: string;
}

/** A row by its brewery, so that nobody writes another's. */
export interface Where {
  breweryId: string;
  id: string;
}

/** As it was seen: another season's board may have changed it meanwhile. */
export type WhereSeen = Where & { version: number };

/** What a brewery keeps in stock for all its seasons, used by shelves and batches. */
export interface Kind<Row extends Named & { version: number }, Create extends Named> {
  /** As sentences, and the names of operations, have it. */
  word: 'yeast' | 'vessel';
  /** The field in which a shelf or a batch names one. */
  field: 'yeastId' | 'vesselId';
  addresses: { all: string; single: string };
  row: z.ZodType<Row>;
  create: z.ZodType<Create> & { shape: object };
  patch: z.ZodType<Partial<Omit<Create, 'id'>>>;
  rowsOf(board: BoardNow): readonly Row[];
  /** Nothing is inserted where the id is taken. */
  insert(tx: Tx, values: Create & { breweryId: string }): Promise<readonly unknown[]>;
  /** Nothing is written where the version is another one by now; so with `remove`. */
  update(tx: Tx, where: WhereSeen, fields: Omit<Create, 'id'>): Promise<readonly unknown[]>;
  remove(tx: Tx, where: WhereSeen): Promise<readonly unknown[]>;
  tell(sayer: Sayer, before: Row, after: Omit<Create, 'id'>): Told;
}
