import type { Board } from '#shared/api/board.ts';
import type { Chain } from '#shared/api/chain.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { newId } from '../../app/newId.ts';
import { moneyKind } from '../../components/form/plainNumbers.ts';
import { written } from '../../components/form/written.ts';

/** What the fields of a chain show at first. */
export function chainValues(chain: Chain | null, board: Board, units: UnitPrefs) {
  const money = moneyKind(board.brewery.currency);
  const start = chain?.start;
  const first = board.yeasts.length === 1 ? board.yeasts[0] : undefined;
  const price = start && 'price' in start ? start.price : (first?.packPrice ?? null);
  return {
    id: chain?.id ?? newId(),
    name: chain?.name ?? first?.name ?? '',
    yeastId: chain?.yeastId ?? first?.id ?? '',
    vesselId: chain?.vesselId ?? null,
    start: {
      kind: start?.kind ?? 'pack',
      price: written(money, price, units),
      batchId: start?.kind === 'cake' ? start.batchId : '',
      generation: written('count', start?.kind === 'outside' ? start.generation : 2, units),
      allergens: start?.kind === 'outside' ? start.allergens : null,
      cultures: start?.kind === 'outside' ? start.cultures : null,
    },
  };
}

/** Of the fields for all three starts, those of the chosen one. */
export function chainShape(body: Record<string, unknown>): Record<string, unknown> {
  const { kind, price, batchId, generation, allergens, cultures } = body.start as Record<
    string,
    unknown
  >;
  const start =
    kind === 'cake'
      ? { kind, batchId }
      : kind === 'outside'
        ? { kind, generation, price, allergens, cultures }
        : { kind, price };
  return { ...body, start };
}
