import { useState } from 'react';
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
  const { batch, run, standing, mine } = usePourView();
  const { path } = useBrewery();
  const advice = standing.link?.advice.filter(({ id }) => AFTER.includes(id));
  return (
    <div className="max-w-xl">
      <PouredNow />
      <h3 className="mt-6 text-h2">Now close it up</h3>
      <AirAndLid key={run.id} />
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
  const [aerated, setAerated] = useState(run.found.aerated ?? false);
  const [lidOn, setLidOn] = useState(run.found.lidOn ?? false);
  const keep = (found: { aerated?: boolean; lidOn?: boolean }) =>
    void send({ kind: 'step', body: { runId: run.id, step: 'after', found } }).catch(
      () => undefined,
    );
  return (
    <div className="mt-3 grid gap-2.5">
      <Tick
        checked={aerated}
        disabled={!mine}
        onChange={(done) => {
          setAerated(done);
          keep({ aerated: done });
        }}
      >
        Air or oxygen given
      </Tick>
      <Tick
        checked={lidOn}
        disabled={!mine}
        onChange={(done) => {
          setLidOn(done);
          keep({ lidOn: done });
        }}
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
