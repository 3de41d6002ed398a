import type { Course, CoursePoint } from '#shared/chain/course.ts';
import { flatBeer } from '../../../components/drawn/beerPaint.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { gravityStep, gravityText } from '../../board/view/words.ts';
import { betweenOf, middleOf } from '../columns.ts';
import { Label } from './Label.tsx';
import { Lane, type LaneOf } from './Lane.tsx';
import { scaleOf, type Scale } from './scales.ts';

const HEIGHT = 120;
const MARK = 14;

/** From original to final gravity, a bar of the beer's colour for each batch. */
export function GravityLane({ course, whole = course }: LaneOf) {
  const ends = whole.points.flatMap(({ og, fg }) => [og, fg]);
  const scale = scaleOf(ends, { top: 30, bottom: HEIGHT - 14, least: 0.02 });
  return (
    <Lane title="Gravity" unit="OG down to FG" height={HEIGHT} course={course}>
      <Steps course={course} />
      {course.points.map((point, place) => (
        <Bar key={point.batchId} point={point} x={middleOf(place)} scale={scale} />
      ))}
    </Lane>
  );
}

function Bar({ point, x, scale }: { point: CoursePoint; x: number; scale: Scale }) {
  const { units } = useBoardView();
  const { og, fg, srm, isOgRead, isFgRead } = point;
  if (og === null) return null;
  const top = scale(og);
  const foot = fg === null ? top + 24 : scale(fg);
  return (
    <g>
      <rect
        x={x - 7}
        y={top}
        width="14"
        height={Math.max(4, foot - top)}
        rx="3"
        className={srm === null ? 'fill-glass stroke-vline' : 'stroke-vline'}
        strokeWidth="1.8"
        strokeDasharray={isOgRead ? undefined : '4 3'}
        {...(srm !== null && { style: { fill: flatBeer(srm) } })}
      />
      <Label x={x + 15} y={top + 11}>
        {gravityText(og, units)}
      </Label>
      {fg !== null && (
        <Label x={x + 15} y={Math.max(foot + 1, top + 27)} quiet>
          {gravityText(fg, units)}
          {isFgRead ? '' : isOgRead ? ', planned' : ''}
        </Label>
      )}
    </g>
  );
}

/** How far it goes up or down from beer to beer. */
function Steps({ course: { points, steps } }: { course: Course }) {
  const { index, units } = useBoardView();
  return steps.map(({ laterId, earlierId, isWithin, link }) => {
    const place = points.findIndex(({ batchId }) => batchId === laterId);
    const [earlier, later] = [index.batch(earlierId), index.batch(laterId)];
    if (!isWithin || place < 1 || !earlier || !later) return null;
    const jumps = link.findings.find(
      ({ rule }) => rule === 'gravity-jump' || rule === 'strong-before-weak',
    );
    const x = betweenOf(place - 1) + 9;
    const tone = jumps ? (jumps.verdict === 'hold' ? 'fill-hold' : 'fill-mind') : 'fill-ink2';
    return (
      <g key={laterId}>
        {jumps && <StepMark x={x} verdict={jumps.verdict} />}
        <Label x={jumps ? x + MARK + 4 : x} y={20} className={tone}>
          {gravityStep(earlier, later, units)}
        </Label>
      </g>
    );
  });
}

/** The verdict by its shape too, for whoever does not see the colour. */
const StepMark = ({ x, verdict }: { x: number; verdict: 'mind' | 'hold' }) => (
  <g
    transform={`translate(${x} ${20 - MARK + 1})`}
    className={verdict === 'hold' ? 'text-hold' : 'text-mind'}
  >
    <VerdictMark verdict={verdict} size={MARK} />
  </g>
);
