import { STAGES, type Batch, type Stage } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import type { BoardIndex } from '#shared/chain/board.ts';
import type { JudgedBoard } from '#shared/chain/judgeBoard.ts';
import { VERDICTS, type Verdict } from '#shared/rules/vocabulary.ts';

/** What a batch must be to be looked at. A null asks for nothing. */
export interface Filter {
  yeast: string | null;
  vessel: string | null;
  verdict: Verdict | null;
  stage: ShownStage | null;
}
/** A scrapped batch stands nowhere on the board. */
export const SHOWN_STAGES = STAGES.filter((stage): stage is ShownStage => stage !== 'scrapped');
export type ShownStage = Exclude<Stage, 'scrapped'>;

const KEYS = ['yeast', 'vessel', 'verdict', 'stage'] as const;

const oneOf = <T extends string>(all: readonly T[], text: string | null): T | null =>
  all.find((each) => each === text) ?? null;

/** As the address tells it; words that mean nothing ask for nothing. */
export const filterOf = (params: URLSearchParams): Filter => ({
  yeast: params.get('yeast'),
  vessel: params.get('vessel'),
  verdict: oneOf(VERDICTS, params.get('verdict')),
  stage: oneOf(SHOWN_STAGES, params.get('stage')),
});

export const isOff = (filter: Filter): boolean => KEYS.every((key) => filter[key] === null);

/** The filter's part of an address, which other parts of it leave alone. */
export function filterParams(params: URLSearchParams): Record<string, string> {
  return Object.fromEntries(
    KEYS.flatMap((key) => {
      const value = params.get(key);
      return value === null || value === '' ? [] : [[key, value]];
    }),
  );
}

interface Where {
  index: BoardIndex;
  judged: JudgedBoard;
}

/** Ids of the batches that are looked at; null: all of them. */
export function matching(filter: Filter, { index, judged }: Where): ReadonlySet<string> | null {
  if (isOff(filter)) return null;
  const fits = (batch: Batch, chain: Chain | null) =>
    agrees(filter.yeast, chain?.yeastId ?? batch.yeastId) &&
    agrees(filter.vessel, batch.vesselId ?? chain?.vesselId ?? null) &&
    agrees(filter.verdict, judged.links.get(batch.id)?.verdict ?? null) &&
    agrees(filter.stage, batch.stage);
  const onShelves = index.chains.flatMap((chain) =>
    index.batchesOf(chain.id).filter((batch) => fits(batch, chain)),
  );
  const onBench = index.bench.filter((batch) => fits(batch, null));
  return new Set([...onShelves, ...onBench].map(({ id }) => id));
}

const agrees = <T>(asked: T | null, is: T | null): boolean => asked === null || asked === is;

/** Those with something that is looked at come first; among them the order stays. */
export function matchesFirst<T>(rows: readonly T[], isMatch: (row: T) => boolean): T[] {
  return [...rows.filter(isMatch), ...rows.filter((row) => !isMatch(row))];
}
