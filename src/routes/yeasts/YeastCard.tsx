import { Link } from 'react-router-dom';
import type { Yeast } from '#shared/api/yeast.ts';
import { formatMoney } from '#shared/units/money.ts';
import { format } from '#shared/units/quantity.ts';
import { useBoard } from '../../api/board.ts';
import { temperatureRange } from '../../app/rangeWords.ts';
import { YEAST_KIND_WORDS } from '../../app/traitWords.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { Logo } from '../../components/drawn/Logo.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { Facts } from '../../components/ui/Facts.tsx';

export function YeastCard({ yeast, onEdit }: { yeast: Yeast; onEdit?: () => void }) {
  return (
    <li className="flex min-w-0 flex-col gap-3 rounded-card border-[1.5px] border-line bg-paper p-5">
      <div className="flex items-start gap-3.5">
        <span className="text-ink">
          <Logo size={44} onPaper />
        </span>
        <div className="min-w-0 grow">
          <h2 className="text-shelf">{yeast.name}</h2>
          <p className="text-small text-ink2">
            {YEAST_KIND_WORDS[yeast.kind]} yeast
            {yeast.character ? ', marked character' : ''}
          </p>
        </div>
        {onEdit && (
          <Button size="small" look="quiet" aria-label={`Edit ${yeast.name}`} onClick={onEdit}>
            Edit
          </Button>
        )}
      </div>
      <YeastFacts yeast={yeast} />
      <OnShelves yeast={yeast} />
      {yeast.notes && <p className="text-small whitespace-pre-line text-ink2">{yeast.notes}</p>}
    </li>
  );
}

function YeastFacts({ yeast }: { yeast: Yeast }) {
  const units = useUnits();
  const { brewery } = useBoard();
  const share = (value: number | null) =>
    value === null ? null : `${Math.round(value * 1000) / 10} %`;
  return (
    <Facts
      facts={[
        {
          term: 'Ferments at',
          value: temperatureRange(yeast.fermentMinC, yeast.fermentMaxC, units),
        },
        { term: 'Poured at', value: temperatureRange(yeast.pourMinC, yeast.pourMaxC, units) },
        {
          term: 'Never above',
          value:
            yeast.neverAboveC === null ? null : format('temperature', yeast.neverAboveC, units),
        },
        {
          term: 'Generations',
          value: yeast.generationLimit === null ? null : `up to ${yeast.generationLimit}`,
        },
        { term: 'Attenuation', value: share(yeast.attenuation) },
        {
          term: 'A pack costs',
          value: yeast.packPrice === null ? null : formatMoney(yeast.packPrice, brewery.currency),
        },
      ]}
    />
  );
}

function OnShelves({ yeast }: { yeast: Yeast }) {
  const { chains } = useBoard();
  const { path } = useBrewery();
  const mine = chains.filter((chain) => chain.yeastId === yeast.id);
  if (mine.length === 0) return <p className="mt-auto text-small text-ink2">On no shelf yet.</p>;
  return (
    <p className="mt-auto text-small text-ink2">
      On{' '}
      <Link to={path()} className="font-medium text-ink underline underline-offset-4">
        {mine.map((chain) => chain.name).join(', ')}
      </Link>
      {' · '}
      <Link
        to={path(`yeasts/${yeast.id}/family`)}
        aria-label={`Family of ${yeast.name}`}
        className="font-medium text-ink underline underline-offset-4"
      >
        Family
      </Link>
    </p>
  );
}
