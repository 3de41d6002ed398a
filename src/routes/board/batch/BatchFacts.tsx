import type { ReactNode } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { formatDay } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { Swatch } from '../../../components/drawn/Swatch.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { fgOf, gravityText, ogOf, stageLine, volumeOf } from '../view/words.ts';

interface BatchFactsProps {
  batch: Batch;
  onClose: () => void;
  /** Under the facts. */
  foot?: ReactNode;
}

/** A batch for those who only read. */
export function BatchFacts({ batch, onClose, foot }: BatchFactsProps) {
  const { board, units } = useBoardView();
  const gravity = (sg: number | null) => (sg === null ? null : gravityText(sg, units));
  const quantity = (kind: 'volume' | 'colour' | 'bitterness' | 'temperature', n: number | null) =>
    n === null ? null : format(kind, n, units);
  const facts: readonly (readonly [string, string | null])[] = [
    ['Stage', stageLine(batch, board.today)],
    ['Brew day', batch.brewOn === null ? null : formatDay(batch.brewOn)],
    ['Volume', quantity('volume', volumeOf(batch))],
    ['Original gravity', gravity(ogOf(batch))],
    ['Final gravity', gravity(fgOf(batch))],
    ['Colour', quantity('colour', batch.srm)],
    ['Bitterness', quantity('bitterness', batch.ibu)],
    ['Ferments at', quantity('temperature', batch.fermentC)],
    ['Allergens', batch.allergens === null ? null : batch.allergens.join(', ') || 'none declared'],
    ['Notes', batch.notes || null],
  ];
  return (
    <Dialog open onClose={onClose} title={batch.name} lead={batch.style}>
      <div className="flex gap-5">
        <Swatch srm={batch.srm} size="large" />
        <dl className="grid flex-1 grid-cols-[auto_1fr] gap-x-4 gap-y-1.5">
          {facts.map(([name, value]) => (
            <div key={name} className="contents">
              <dt className="text-ink2">{name}</dt>
              <dd className="wrap-anywhere">{value ?? 'not known'}</dd>
            </div>
          ))}
        </dl>
      </div>
      {foot && <div className="mt-5">{foot}</div>}
    </Dialog>
  );
}
