const STEP = 22;
const HEIGHT = 13;

/** The living top edge of a band that lies along the shelf. */
export function topEdge(width: number): string {
  const count = Math.max(2, Math.round(width / STEP));
  const step = width / count;
  const waves = Array.from(
    { length: count },
    (_, i) => `q${step / 2} ${i % 2 ? 2.4 : -2.4} ${step} 0`,
  );
  return `M0 4 ${waves.join(' ')}`;
}

/** The two parts that are left of a torn band, as a clip. */
export function tornClip(width: number): string {
  const a = width * 0.4;
  const b = width * 0.6;
  const left = `M0 -6H${a - 6}L${a + 4} 1 ${a - 2} 6 ${a + 6} ${HEIGHT}H0Z`;
  const right = `M${width} -6H${b + 6}L${b - 4} 2 ${b + 3} 7 ${b - 5} ${HEIGHT}H${width}Z`;
  return left + right;
}

/** The living right edge of a band that runs down the page. */
export function sideEdge(height: number): string {
  const count = Math.max(1, Math.round(height / 20));
  const step = height / count;
  const waves = Array.from(
    { length: count },
    (_, i) => `q${i % 2 ? -2.6 : 2.6} ${step / 2} 0 ${step}`,
  );
  return `M18 0 ${waves.join(' ')}`;
}
