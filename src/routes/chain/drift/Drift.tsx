import { useMemo } from 'react';
import { driftOf, hasDrift, type DriftPoint } from '#shared/chain/drift.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { TextLink } from '../../../components/ui/TextLink.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { scaleOf } from '../plots/scales.ts';
import { FIGURES, type Figure } from './figures.ts';

/** What was read along a line, against its generation: whether it drifts. */
export function Drift({ chainId }: { chainId: string }) {
  const { index, judged } = useBoardView();
  const points = useMemo(() => driftOf(index, judged, chainId), [index, judged, chainId]);
  if (points.length === 0) return null;
  return (
    <section className="mt-7 pr-7 max-tablet:pr-[18px]">
      <h2 id="drift" className="text-shelf">
        Read along the line
      </h2>
      <p className="mt-1 max-w-2xl text-small text-ink2">
        Only what was read: a line that drifts shows it here. Attenuation, lag and days hang on the
        beer too, so compare like with like.
      </p>
      {hasDrift(points) && (
        <div className="mt-3 grid grid-cols-4 gap-3 max-wide:grid-cols-2">
          {FIGURES.map((figure) => (
            <Plot key={figure.title} figure={figure} points={points} />
          ))}
        </div>
      )}
      <Table points={points} />
    </section>
  );
}

const WIDTH = 200;
const HEIGHT = 92;

function Plot({ figure, points }: { figure: Figure; points: readonly DriftPoint[] }) {
  const { title, unit, valueOf, least } = figure;
  const values = points.map(valueOf);
  const y = scaleOf(values, { top: 26, bottom: HEIGHT - 22, least });
  const x = (at: number) =>
    points.length === 1 ? WIDTH / 2 : 18 + (at * (WIDTH - 36)) / (points.length - 1);
  const known = values.flatMap((value, at) => (value === null ? [] : [{ value, at }]));
  return (
    <div className="rounded-card border-[1.5px] border-line bg-paper px-3.5 py-2.5">
      <h3 className="text-h3 font-[680]">{title}</h3>
      <p className="text-small text-ink2">{unit}</p>
      {known.length === 0 ? (
        <p className="mt-2 text-small text-ink2">Not read yet.</p>
      ) : (
        <svg
          aria-hidden
          viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
          className="mt-1 block h-auto w-full overflow-visible font-sans"
        >
          <path d={`M6 ${HEIGHT - 16}H${WIDTH - 6}`} className="stroke-line2" />
          <polyline
            points={known.map(({ value, at }) => `${x(at)},${y(value)}`).join(' ')}
            className="fill-none stroke-ink"
            strokeWidth="2"
          />
          {known.map(({ value, at }) => (
            <g key={at}>
              <circle
                cx={x(at)}
                cy={y(value)}
                r="4.2"
                className="fill-white stroke-ink"
                strokeWidth="2.2"
              />
              <text
                x={x(at)}
                y={y(value) - 9}
                textAnchor="middle"
                className="fill-ink text-[13px] font-bold"
              >
                {Math.round(value)}
              </text>
            </g>
          ))}
          {points.map(({ generation }, at) => (
            <text
              key={at}
              x={x(at)}
              y={HEIGHT - 2}
              textAnchor="middle"
              className="fill-ink2 text-[12px]"
            >
              {generation === null ? '?' : `gen ${generation}`}
            </text>
          ))}
        </svg>
      )}
    </div>
  );
}

function Table({ points }: { points: readonly DriftPoint[] }) {
  const { path } = useBrewery();
  return (
    <div className="mt-3 overflow-x-auto">
      <table aria-labelledby="drift" className="text-small">
        <thead className="text-left text-ink2">
          <tr>
            <th scope="col" className="border-b border-edge py-1.5 pr-4 font-semibold">
              Batch
            </th>
            <th scope="col" className="border-b border-edge px-3 py-1.5 font-semibold">
              Generation
            </th>
            {FIGURES.map(({ title }) => (
              <th
                key={title}
                scope="col"
                className="border-b border-edge px-3 py-1.5 font-semibold"
              >
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {points.map((point) => (
            <tr key={point.batchId}>
              <th scope="row" className="border-b border-line py-2 pr-4 text-left">
                <TextLink to={path(`batches/${point.batchId}`)}>{point.name}</TextLink>
              </th>
              <td className="border-b border-line px-3 py-2">{point.generation ?? 'not known'}</td>
              {FIGURES.map(({ title, textOf }) => (
                <td key={title} className="border-b border-line px-3 py-2 whitespace-nowrap">
                  {textOf(point) ?? <span className="text-ink2">not read</span>}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
