import type { ReactNode } from 'react';
import type { Course } from '#shared/chain/course.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { betweenOf, COLUMN, widthOf } from '../columns.ts';

/** What a lane shows: a course, or a part of one on the scale of the whole. */
export interface LaneOf {
  course: Course;
  whole?: Course;
}

interface LaneProps {
  title: string;
  unit: string;
  height: number;
  course: Course;
  children: ReactNode;
}

const LINES: Record<Verdict, string> = {
  pour: 'stroke-pour',
  mind: 'stroke-mind',
  hold: 'stroke-hold',
};
const DASHES: Record<Verdict, string | undefined> = {
  pour: undefined,
  mind: '7 5',
  hold: '2 5',
};

/** One figure along the chain, under the vessels. Its numbers stand in the table, for whoever hears the page. */
export function Lane({ title, unit, height, course, children }: LaneProps) {
  const width = widthOf(course.points.length);
  return (
    <section className="flex w-max min-w-full border-t border-line max-tablet:flex-col print:break-inside-avoid">
      <header
        className="sticky left-0 z-[2] shrink-0 bg-stone pt-1.5 pr-2 max-tablet:flex max-tablet:w-max! max-tablet:items-baseline max-tablet:gap-2 max-tablet:bg-transparent"
        style={{ width: COLUMN.label }}
      >
        <h3 className="text-h3 font-[680]">{title}</h3>
        <p className="text-small text-ink2">{unit}</p>
      </header>
      <svg
        aria-hidden
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        className="block overflow-visible font-sans"
      >
        <Verdicts course={course} height={height} />
        {children}
      </svg>
    </section>
  );
}

/** A line down from each link, drawn as its verdict is. */
function Verdicts({ course: { points, steps }, height }: { course: Course; height: number }) {
  return steps.map(({ laterId, isWithin, link: { verdict } }) => {
    const place = points.findIndex(({ batchId }) => batchId === laterId);
    if (!isWithin || place < 1) return null;
    const x = betweenOf(place - 1);
    return (
      <path
        key={laterId}
        d={`M${x} 0V${height}`}
        className={LINES[verdict]}
        strokeWidth="1.6"
        strokeDasharray={DASHES[verdict]}
        opacity="0.75"
      />
    );
  });
}
