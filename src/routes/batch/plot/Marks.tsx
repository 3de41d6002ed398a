import type { Mark } from './course.ts';
import { TEXT, type Frame, type ToX } from './frame.ts';

/** The pour, the racking, today, and what was done in between. */
export function Marks({ marks, x, frame }: { marks: readonly Mark[]; x: ToX; frame: Frame }) {
  return marks.map(({ day, words, kind }, at) =>
    kind === 'event' ? (
      <g key={at}>
        <path d={`M${x(day)} ${frame.bottom - 14}v14`} className="stroke-mind" strokeWidth="1.6" />
        <MarkText x={x(day)} y={frame.bottom - 5} words={words} frame={frame} />
      </g>
    ) : (
      <g key={at}>
        <path
          d={`M${x(day)} ${frame.top - 4}V${frame.bottom}`}
          className="stroke-bottle"
          strokeWidth="2"
          strokeDasharray={kind === 'today' ? '5 4' : undefined}
        />
        <MarkText x={x(day)} y={frame.top + 4} words={words} frame={frame} isStrong />
      </g>
    ),
  );
}

interface MarkTextProps {
  x: number;
  y: number;
  words: string;
  frame: Frame;
  isStrong?: boolean;
}

/** On the side where there is room. */
function MarkText({ x, y, words, frame, isStrong = false }: MarkTextProps) {
  const isLate = x > (frame.left + frame.right) / 2;
  return (
    <text
      x={isLate ? x - 7 : x + 6}
      y={y}
      textAnchor={isLate ? 'end' : 'start'}
      className={isStrong ? 'fill-bottle text-[13.5px] font-bold' : TEXT}
    >
      {words}
    </text>
  );
}
