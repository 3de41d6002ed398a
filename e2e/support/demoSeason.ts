import { addDays } from '#shared/units/day.ts';
import { DEMO_BENCH, DEMO_CHAINS } from '../../server/db/demo/batches.ts';
import type { DemoBatch } from '../../server/db/demo/demoBatch.ts';
import type { BoardPlan } from './board.ts';

const FIRST_DAY = '2027-03-06';

const batchOf = ({ plan, brewDay, stage, read }: DemoBatch) => ({
  ...plan,
  stage,
  brewOn: brewDay === null ? null : addDays(FIRST_DAY, brewDay),
  rackedOn: read?.rackDay === undefined ? null : addDays(FIRST_DAY, read.rackDay),
});

/** The season that a first start shows, in a brewery of a test's own. */
export const demoSeason = (): BoardPlan => ({
  shelves: DEMO_CHAINS.map(({ name, yeast, batches }) => ({
    name,
    kind: yeast === 'lantern' ? ('lager' as const) : ('ale' as const),
    batches: batches.map(batchOf),
  })),
  bench: DEMO_BENCH.map(batchOf),
});
