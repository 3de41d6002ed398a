import { formatDayShort } from '#shared/units/day.ts';
import { format, formatBare } from '#shared/units/quantity.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { dayOf } from '../../../app/zonedTime.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { dayTicks, type Axis } from './axes.ts';
import type { Drawn } from './course.ts';
import { NARROW, TEXT, type Frame, type ToX, type ToY } from './frame.ts';

export function GravityTicks({ axis, y, frame }: { axis: Axis; y: ToY; frame: Frame }) {
  const units = useUnits();
  return axis.ticks.map((tick) => (
    <g key={tick}>
      <path d={`M${frame.left} ${y(tick)}H${frame.right}`} className="stroke-line2" />
      <text x={frame.left - 7} y={y(tick) + 4.5} textAnchor="end" className={TEXT}>
        {formatBare('gravity', tick, units)}
      </text>
    </g>
  ));
}

export function WarmthTicks({ axis, y, frame }: { axis: Axis; y: ToY; frame: Frame }) {
  const units = useUnits();
  return axis.ticks.map((tick) => (
    <text key={tick} x={frame.right + 7} y={y(tick) + 4.5} className={TEXT}>
      {format('temperature', tick, units)}
    </text>
  ));
}

export function DayTicks({ drawn, x, frame }: { drawn: Drawn; x: ToX; frame: Frame }) {
  const { timeZone } = useBoardView().board.brewery;
  const first = formatDayShort(dayOf(drawn.start, timeZone));
  return dayTicks(drawn.days, frame === NARROW ? 4 : 8).map((day) => (
    <g key={day}>
      <path d={`M${x(day)} ${frame.bottom}v5`} className="stroke-edge" />
      <text x={x(day)} y={frame.bottom + 20} textAnchor="middle" className={TEXT}>
        {day === 0 ? first : `day ${day}`}
      </text>
    </g>
  ));
}
