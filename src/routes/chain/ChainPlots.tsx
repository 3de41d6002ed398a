import type { Chain } from '#shared/api/chain.ts';
import type { Course } from '#shared/chain/course.ts';
import { formatMoney } from '#shared/units/money.ts';
import { formatBare, unitOf } from '#shared/units/quantity.ts';
import { useBoardView } from '../board/view/BoardView.tsx';
import { AliveLane } from './plots/AliveLane.tsx';
import { GravityLane } from './plots/GravityLane.tsx';
import type { LaneOf } from './plots/Lane.tsx';
import { ValueLane } from './plots/ValueLane.tsx';
import { ChainShelf } from './shelf/ChainShelf.tsx';

/** The shelf, and under its vessels what changes along it; the two scroll as one. */
export function ChainPlots({ chain, course }: { chain: Chain; course: Course }) {
  return (
    <section
      aria-label={`Batches and figures of ${chain.name}`}
      className="thumb-slim mt-2 overflow-x-auto overflow-y-hidden overscroll-x-contain pb-2 print:overflow-visible print:[zoom:0.72]"
    >
      <ChainShelf chain={chain} course={course} />
      <h2 className="sr-only">Along the chain</h2>
      <Lanes course={course} />
    </section>
  );
}

/** Gravity, colour, bitterness, what is alive and what it cost. */
export function Lanes({ course, whole = course }: LaneOf) {
  const { board, units } = useBoardView();
  const money = (minor: number) => formatMoney(minor, board.brewery.currency);
  return (
    <>
      <GravityLane course={course} whole={whole} />
      <ValueLane
        title="Colour"
        unit={`${unitOf('colour', units)} as poured`}
        course={course}
        whole={whole}
        valueOf={({ srm }) => srm}
        say={(srm) => formatBare('colour', srm, units)}
        least={4}
        isColour
      />
      <ValueLane
        title="Bitterness"
        unit="IBU as poured"
        course={course}
        whole={whole}
        valueOf={({ ibu }) => ibu}
        say={(ibu) => formatBare('bitterness', ibu, units)}
        least={20}
      />
      <AliveLane course={course} whole={whole} />
      <ValueLane
        title="Cost"
        unit="yeast, for each batch so far"
        course={course}
        whole={whole}
        valueOf={({ cost }) => cost}
        say={money}
        least={100}
      />
    </>
  );
}
