import type { Point } from './course.ts';

/**
 * At most some `most` points that draw the same line: of each stretch the first, the lowest, the
 * highest and the last. Few points come back as they are.
 */
export function thinned(points: readonly Point[], most = 400): readonly Point[] {
  if (points.length <= most) return points;
  const size = Math.ceil(points.length / (most / 4));
  const kept: Point[] = [];
  for (let at = 0; at < points.length; at += size)
    kept.push(...extremes(points.slice(at, at + size)));
  return kept;
}

function extremes(stretch: readonly Point[]): Point[] {
  const [first] = stretch;
  const last = stretch.at(-1);
  if (!first || !last) return [];
  let [low, high] = [first, first];
  for (const point of stretch) {
    if (point.value < low.value) low = point;
    if (point.value > high.value) high = point;
  }
  return [...new Set([first, low, high, last])].sort((a, b) => a.day - b.day);
}
