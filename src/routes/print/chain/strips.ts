import type { Course } from '#shared/chain/course.ts';

/** Few batches stand wide, many close: four columns are the most that can be read on a sheet. */
export const batchesAcross = (batches: number): 3 | 4 => (batches === 4 || batches > 6 ? 4 : 3);

/** A course in parts, each as wide as a sheet. */
export function stripsOf({ points, steps }: Course): Course[] {
  const across = batchesAcross(points.length);
  const count = Math.ceil(points.length / across);
  return Array.from({ length: count }, (_, strip) => ({
    points: points.slice(strip * across, (strip + 1) * across),
    steps,
  }));
}
