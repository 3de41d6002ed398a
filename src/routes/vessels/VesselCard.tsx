import type { Vessel as VesselRow } from '#shared/api/vessel.ts';
import { formatDay } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { useBoard } from '../../api/board.ts';
import { temperaturesHeld } from '../../app/rangeWords.ts';
import { SHAPE_WORDS } from '../../app/traitWords.ts';
import { useUnits } from '../../app/useUnits.ts';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { Facts } from '../../components/ui/Facts.tsx';
import { contentOf } from './contentOf.ts';

export function VesselCard({ vessel, onEdit }: { vessel: VesselRow; onEdit?: () => void }) {
  const content = contentOf(useBoard(), vessel.id);
  return (
    <li className="flex min-w-0 gap-5 overflow-clip rounded-card border-[1.5px] border-line bg-paper p-5">
      <div className="shrink-0 self-end">
        <Vessel
          shape={vessel.shape}
          srm={content?.srm ?? null}
          fill={content ? (content.volumeL ?? 0) / vessel.capacityL : 0}
          cake={null}
          stage="racked"
          width={84}
        />
      </div>
      <div className="flex min-w-0 grow flex-col gap-2.5">
        <div className="flex items-start gap-3">
          <div className="min-w-0 grow">
            <h2 className="text-shelf">{vessel.name}</h2>
            <p className="text-small text-ink2">
              {SHAPE_WORDS[vessel.shape]}
              {content ? `, holds ${content.name}` : ', empty'}
            </p>
          </div>
          {onEdit && (
            <Button size="small" look="quiet" aria-label={`Edit ${vessel.name}`} onClick={onEdit}>
              Edit
            </Button>
          )}
        </div>
        <VesselFacts vessel={vessel} />
        {vessel.notes && <p className="text-small whitespace-pre-line text-ink2">{vessel.notes}</p>}
      </div>
    </li>
  );
}

function VesselFacts({ vessel }: { vessel: VesselRow }) {
  const units = useUnits();
  return (
    <Facts
      facts={[
        { term: 'To the brim', value: format('volume', vessel.capacityL, units) },
        { term: 'Blow-off tube', value: vessel.blowOff ? 'fitted' : 'none' },
        { term: 'Holds', value: temperaturesHeld(vessel.minC, vessel.maxC, units) },
        { term: 'Cleaned', value: vessel.cleanedOn && formatDay(vessel.cleanedOn) },
      ]}
    />
  );
}
