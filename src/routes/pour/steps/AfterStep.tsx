import { useBrewery } from '../../../app/useBrewery.ts';
import { LinkButton } from '../../../components/ui/LinkButton.tsx';
import { Advice } from '../../board/panel/Advice.tsx';
import { Caution } from '../Caution.tsx';
import { usePourView } from '../pourView.ts';
import { Tick } from '../Tick.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { PouredNow } from './PouredNow.tsx';
import { LaterDates } from './LaterDates.tsx';

const AFTER = ['oxygen', 'second-oxygen', 'blow-off'];

/** The wort is on the cake: air, lid, blow-off; the record; the dates behind. */
export function AfterStep() {
  const { batch, standing, mine } = usePourView();
  const { path } = useBrewery();
  const advice = standing.link?.advice.filter(({ id }) => AFTER.includes(id));
  return (
    <div className="max-w-xl">
      <PouredNow />
      <h3 className="mt-6 text-h2">Now close it up</h3>
      <AirAndLid />
      {advice && advice.length > 0 && <Advice advice={advice} />}
      <Caution>
        Never block an airlock or a blow-off tube: the gas of a strong start lifts lids and bursts
        glass.
      </Caution>
      {mine && <LaterDates batch={batch} />}
      <LinkButton look="first" size="large" className="mt-6 w-full" to={path()}>
        Done, to the board
      </LinkButton>
    </div>
  );
}

function AirAndLid() {
  const { run, mine, send, error } = usePourView();
  const keep = (found: { aerated?: boolean; lidOn?: boolean }) =>
    void send({ kind: 'step', body: { runId: run.id, step: 'after', found } }).catch(
      () => undefined,
    );
  return (
    <div className="mt-3 grid gap-2.5">
      <Tick
        checked={run.found.aerated ?? false}
        disabled={!mine}
        onChange={(aerated) => keep({ aerated })}
      >
        Air or oxygen given
      </Tick>
      <Tick
        checked={run.found.lidOn ?? false}
        disabled={!mine}
        onChange={(lidOn) => keep({ lidOn })}
      >
        Lid on, airlock or blow-off fitted
      </Tick>
      {error && (
        <Notice kind="hold" alert>
          {error}
        </Notice>
      )}
    </div>
  );
}
