import { Link } from 'react-router-dom';
import type { Kin } from '#shared/chain/family.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { Logo } from '../../components/drawn/Logo.tsx';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { VerdictMark } from '../../components/drawn/VerdictMark.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { drawnVessel } from '../board/view/drawing.ts';
import { stageLine } from '../board/view/words.ts';
import { startWords } from './kinWords.ts';
import { layOut, type Placed } from './layout.ts';

/** px */
const CELL = { width: 192, height: 104, head: 30, vessel: 46, middle: 62 } as const;
const xOf = (column: number) => column * CELL.width;
const yOf = (row: number) => CELL.head + row * CELL.height;

/** Generations in columns, the cake running from vessel to vessel. The list beside it tells the same. */
export function FamilyTree({ family }: { family: readonly Kin[] }) {
  const { placed, columns, rows } = layOut(family);
  const width = columns * CELL.width;
  const height = yOf(rows);
  return (
    <div
      aria-hidden
      className="thumb-slim overflow-x-auto rounded-card border-[1.5px] border-line bg-paper p-5 print:overflow-visible print:border-0 print:[zoom:0.7]"
    >
      <div className="relative" style={{ width, height }}>
        {Array.from({ length: columns }, (_, column) => (
          <p
            key={column}
            className="absolute top-0 text-small text-ink2"
            style={{ left: xOf(column) }}
          >
            {column === 0 ? 'start' : `generation ${column}`}
          </p>
        ))}
        <svg width={width} height={height} className="absolute inset-0 block">
          {placed.map((one) => one.from && <Cake key={one.kin.id} placed={one} />)}
        </svg>
        {placed.map((one) => (
          <Node key={one.kin.id} placed={one} />
        ))}
      </div>
    </div>
  );
}

/** From the foot of one vessel to the foot of the next; down to its own row first where it branches off. */
function Cake({ placed: { kin, column, row, from } }: { placed: Placed }) {
  if (!from) return null;
  const x0 = xOf(from.column) + CELL.vessel / 2;
  const y0 = yOf(from.row) + CELL.middle + 8;
  const x1 = xOf(column) + CELL.vessel / 2;
  const y1 = yOf(row) + CELL.middle + 8;
  const path = y0 === y1 ? `M${x0} ${y0}H${x1}` : `M${x0} ${y0}V${y1 - 14}q0 14 14 14H${x1}`;
  const verdict: Verdict = kin.kind === 'batch' ? (kin.link?.verdict ?? 'pour') : 'pour';
  const dash = { pour: undefined, mind: '11 4', hold: '5 9' }[verdict];
  return (
    <g className="fill-none">
      <path d={path} className="stroke-cake-dd" strokeWidth="9" strokeDasharray={dash} />
      <path d={path} className="stroke-cake" strokeWidth="6" strokeDasharray={dash} />
    </g>
  );
}

const TONES: Record<Verdict, string> = {
  pour: 'text-pour',
  mind: 'text-mind',
  hold: 'text-hold',
};

function Node({ placed: { kin, column, row } }: { placed: Placed }) {
  const { board, index, judged } = useBoardView();
  const { path } = useBrewery();
  const link = kin.kind === 'batch' ? kin.link : null;
  return (
    <>
      {link && (
        <span
          className={`absolute grid size-6 place-items-center rounded-full bg-paper ${TONES[link.verdict]}`}
          style={{ left: xOf(column) - 34, top: yOf(row) + CELL.middle - 4 }}
        >
          <VerdictMark verdict={link.verdict} size={18} />
        </span>
      )}
      <Link
        // The list has the same way for the keyboard.
        tabIndex={-1}
        to={path(`chains/${kin.chain.id}`)}
        className="absolute flex gap-2 no-underline"
        style={{ left: xOf(column), top: yOf(row), width: CELL.width - 38 }}
      >
        <span className="w-[46px] shrink-0">
          {kin.kind === 'start' ? (
            <span className="grid h-[76px] place-items-end justify-center text-ink">
              <Logo size={44} onPaper />
            </span>
          ) : (
            <Vessel
              {...drawnVessel(kin.batch, index, judged, board.today)}
              label=""
              width={CELL.vessel}
            />
          )}
        </span>
        <span className="min-w-0 pt-2 leading-tight">
          <b className="line-clamp-2 text-small">
            {kin.kind === 'start' ? kin.chain.name : kin.batch.name}
          </b>
          <span className="line-clamp-2 text-[0.8125rem] text-ink2">
            {kin.kind === 'start' ? startWords(kin.chain) : stageLine(kin.batch, board.today)}
          </span>
        </span>
      </Link>
    </>
  );
}
