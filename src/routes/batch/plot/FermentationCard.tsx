import { useMemo, useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { BatchRecord } from '#shared/api/reading.ts';
import { BAND_BASIS } from '#shared/fermentation/band.ts';
import { steadyHours } from '#shared/fermentation/stuck.ts';
import { sayIn } from '#shared/rules/say.ts';
import { formatDayShort } from '#shared/units/day.ts';
import { temperatureRange } from '../../../app/rangeWords.ts';
import { dayOf } from '../../../app/zonedTime.ts';
import { Card, CardTitle } from '../../../components/ui/Card.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { gravityText } from '../../board/view/words.ts';
import { drawnOf, warningsOf, type Drawn } from './course.ts';
import { FermentationPlot } from './FermentationPlot.tsx';
import { NoticeBlock } from './NoticeBlock.tsx';

interface FermentationCardProps {
  batch: Batch;
  record: BatchRecord;
}

/** The course of a fermentation, what it warns of, and how steady it stands. */
export function FermentationCard({ batch, record }: FermentationCardProps) {
  const { board, index, units } = useBoardView();
  const { timeZone } = board.brewery;
  const chain = index.chain(batch.chainId ?? '');
  const yeast = index.yeasts.get(chain?.yeastId ?? batch.yeastId ?? '');
  const [now] = useState(() => Date.now());
  const drawn = useMemo(
    () => drawnOf({ batch, record, yeast, timeZone, now }),
    [batch, record, yeast, timeZone, now],
  );
  const isRead = drawn !== null && drawn.gravity.length + drawn.temperature.length > 0;
  const warnings = warningsOf(batch, yeast, sayIn(units));
  return (
    <Card>
      <div className="mb-2 flex flex-wrap items-center gap-x-4 gap-y-1">
        <CardTitle>Fermentation</CardTitle>
        {isRead && <Legend drawn={drawn} />}
      </div>
      {warnings.map((notice) => (
        <NoticeBlock key={notice.id} notice={notice} />
      ))}
      {isRead ? (
        <figure>
          <FermentationPlot drawn={drawn} />
          <figcaption className="mt-1 text-small text-ink2">
            <Summary batch={batch} /> {drawn.band.length > 0 && BAND_BASIS}
          </figcaption>
        </figure>
      ) : (
        <p className="text-ink2">
          {batch.stage === 'pencilled'
            ? 'It is not brewed yet. Its course is drawn from the first reading on.'
            : 'Its course is drawn from the first reading on.'}
        </p>
      )}
    </Card>
  );
}

function Legend({ drawn }: { drawn: Drawn }) {
  const { units } = useBoardView();
  const range = drawn.range && temperatureRange(drawn.range.min, drawn.range.max, units);
  return (
    <ul aria-hidden className="ml-auto flex flex-wrap gap-x-4 gap-y-1 text-small text-ink2">
      <li className="flex items-center gap-1.5">
        <svg width="30" height="12">
          <path d="M0 6h30" className="stroke-ink" strokeWidth="2.6" />
          <circle cx="15" cy="6" r="4.2" className="fill-white stroke-ink" strokeWidth="2.2" />
        </svg>
        gravity
      </li>
      {drawn.temperature.length > 0 && (
        <li className="flex items-center gap-1.5">
          <svg width="30" height="12" className="stroke-mind">
            <path d="M1 6h28" strokeWidth="1.3" />
            <path d="M2 6h28" strokeWidth="2.4" strokeDasharray="1 4.5" strokeLinecap="round" />
          </svg>
          beer temperature
        </li>
      )}
      {drawn.band.length > 0 && (
        <li className="flex items-center gap-1.5">
          <svg width="22" height="12">
            <rect width="22" height="12" rx="3" className="fill-pour-l stroke-pour" />
          </svg>
          expected
        </li>
      )}
      {drawn.temperature.length > 0 && range && (
        <li className="flex items-center gap-1.5">
          <svg width="22" height="12">
            <rect width="22" height="12" rx="3" className="fill-cake opacity-60 dark:opacity-25" />
          </svg>
          {range}
        </li>
      )}
    </ul>
  );
}

/** "1.011 on 3 Apr, steady for 3 days." */
function Summary({ batch }: { batch: Batch }) {
  const { board, units } = useBoardView();
  const { followed } = batch;
  if (!followed?.gravityAt || followed.gravity === null) return null;
  const day = formatDayShort(dayOf(followed.gravityAt, board.brewery.timeZone));
  const hours = steadyHours({ followed }) ?? 0;
  const days = Math.floor(hours / 24);
  const steady = days >= 1 ? `, steady for ${days} ${days === 1 ? 'day' : 'days'}` : '';
  return (
    <b className="text-ink">
      {gravityText(followed.gravity, units)} on {day}
      {steady}.
    </b>
  );
}
