import type { CakeCheck } from '#shared/api/cakeCheck.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { written } from '../../../components/form/written.ts';

export type Amount = 'volume' | 'mass' | 'weighed';

const amountOf = (check: CakeCheck | null): Amount => {
  if (check === null || (check.massKg === null && check.fullKg === null)) return 'volume';
  return check.fullKg === null ? 'mass' : 'weighed';
};

/** What the fields of a cake check show at first. */
export function checkValues(check: CakeCheck | null, units: UnitPrefs) {
  const typed = check?.typed ?? {};
  const count = check?.count ?? null;
  const number = (key: 'living' | 'dead' | 'squares', start: number | null = null) =>
    written('count', count?.[key] ?? start, units, typed[`count.${key}`]);
  return {
    tasted: check?.tasted ?? null,
    faults: check?.faults ?? [],
    amount: amountOf(check),
    volumeL: written('volume', check?.volumeL ?? null, units, typed.volumeL),
    massKg: written('mass', check?.massKg ?? null, units, typed.massKg),
    fullKg: written('mass', check?.fullKg ?? null, units, typed.fullKg),
    tareKg: written('mass', check?.tareKg ?? null, units, typed.tareKg),
    layers: check?.layers ?? null,
    colour: check?.colour ?? null,
    smells: check?.smells ?? [],
    counted: count !== null,
    count: {
      living: number('living'),
      dead: number('dead'),
      squares: number('squares', 5),
      dilution: written('number', count?.dilution ?? 100, units, typed['count.dilution']),
    },
    judged: check?.judged ?? null,
    notes: check?.notes ?? '',
  };
}

/** The fields as the contract wants them: one way of measuring the amount, and a count if there was one. */
export function checkShape({
  amount,
  counted,
  ...body
}: Record<string, unknown>): Record<string, unknown> {
  const only = (way: Amount, value: unknown) => (amount === way ? value : null);
  return {
    ...body,
    faults: body.tasted === 'off' ? body.faults : [],
    volumeL: only('volume', body.volumeL),
    massKg: only('mass', body.massKg),
    fullKg: only('weighed', body.fullKg),
    tareKg: only('weighed', body.tareKg),
    count: counted ? body.count : null,
  };
}
