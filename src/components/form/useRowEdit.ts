import { useState } from 'react';
import type { z } from 'zod';
import type { Typed } from '#shared/api/units.ts';
import { isProblem } from '../../api/errors.ts';
import { changesFrom, conflictsOf, mergeTyped } from './rowEdit.ts';

interface Versioned {
  version: number;
}

export interface RowEdit<Row extends Versioned, Facts extends object> {
  row: Row;
  schema: z.ZodType<Row>;
  /** The editable part of a row. */
  factsOf: (row: Row) => Facts;
  save: (version: number, patch: Partial<Facts>) => Promise<unknown>;
  onDone: () => void;
}

export interface Conflict<Facts> {
  keys: (keyof Facts)[];
  mine: Partial<Facts>;
  theirs: Facts;
  version: number;
}

/**
 * Saves only what was changed here. If somebody saved in the meantime, fields that only one of the
 * two touched are joined; where both touched one, the person chooses and it is saved again.
 */
export function useRowEdit<Row extends Versioned, Facts extends object>(edit: RowEdit<Row, Facts>) {
  const [base, rebase] = useState(edit.row);
  const [conflict, setConflict] = useState<Conflict<Facts> | null>(null);

  const attempt = async (version: number, patch: Partial<Facts>, seen: Facts) => {
    if (Object.keys(patch).length === 0) return edit.onDone();
    try {
      await edit.save(version, patch);
    } catch (error) {
      const now = isProblem(error, 'changed-since')
        ? edit.schema.safeParse(error.problem.current)
        : null;
      if (!now?.success) throw error;
      const theirs = edit.factsOf(now.data);
      const keys = conflictsOf(seen, patch, theirs);
      if (keys.length > 0)
        return setConflict({ keys, mine: patch, theirs, version: now.data.version });
      return attempt(now.data.version, withTyped(patch, theirs), theirs);
    }
    edit.onDone();
  };

  return {
    /** The row as it was when the form was opened, or followed last. */
    base,
    /** Starts from another row; what the fields show must be set to it as well. */
    rebase,
    conflict,
    backToForm: () => setConflict(null),
    submit: (next: Facts) => {
      const seen = edit.factsOf(base);
      return attempt(base.version, changesFrom(seen, next), seen);
    },
    /** Saves again, without the fields where theirs is to stand. */
    resolve: async (theirKeys: readonly (keyof Facts)[]) => {
      if (!conflict) return;
      const patch = { ...conflict.mine };
      for (const key of theirKeys) delete patch[key];
      await attempt(conflict.version, withTyped(patch, conflict.theirs), conflict.theirs);
    },
  };
}

function withTyped<Facts extends object>(patch: Partial<Facts>, theirs: Facts): Partial<Facts> {
  const keys = Object.keys(patch).filter((key) => key !== 'typed');
  if (keys.length === 0) return {};
  if (!('typed' in patch) || !('typed' in theirs)) return patch;
  const typed = mergeTyped(theirs.typed as Typed, patch.typed as Typed, keys);
  return { ...patch, typed };
}
