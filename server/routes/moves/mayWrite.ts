import {
  canAcceptHolds,
  canEditBatches,
  canEditChains,
  canEditSeason,
  canEditYeastsAndVessels,
  type InRole,
} from '../../policies.ts';
import { problem } from '../../problems.ts';
import type { EditSide } from '../../record/difference.ts';
import { TABLE_NAMES, type TableName } from '../../record/tables.ts';

const MAY: Record<TableName, (member: InRole) => boolean> = {
  brewery: canEditSeason,
  season: canEditSeason,
  house_rules: canEditSeason,
  yeast: canEditYeastsAndVessels,
  yeast_line: canEditChains,
  vessel: canEditYeastsAndVessels,
  chain: canEditChains,
  batch: canEditBatches,
  cake: canEditBatches,
  cake_check: canEditBatches,
};

/** What somebody may no longer edit they may no longer undo either: roles change. */
export function demandMayWrite(member: InRole, to: EditSide): void {
  const writes = TABLE_NAMES.filter((name) => to.rows[name] !== undefined);
  const accepts = Object.keys(to.accepted ?? {}).length > 0;
  if (
    !writes.every((name) => MAY[name](member)) ||
    (accepts && !canAcceptHolds(member) && isAcceptance(to))
  )
    throw problem('not-allowed');
}

/** Nothing but an acceptance comes back. One that went with an edit comes back with that edit. */
const isAcceptance = ({ rows }: EditSide): boolean =>
  Object.values(rows.batch ?? {}).every(
    (row) => row !== null && Object.keys(row).every((column) => column === 'acceptance'),
  );
