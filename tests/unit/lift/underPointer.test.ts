// @vitest-environment jsdom
import { afterEach, expect, it, vi } from 'vitest';
import { createUnderPointer } from '../../../src/routes/board/lift/underPointer.ts';

/** jsdom lays nothing out: each element says in `data-box` where it is, left, top, width, height. */
function page(html: string) {
  document.body.innerHTML = html;
  return vi.spyOn(Element.prototype, 'getBoundingClientRect').mockImplementation(function (
    this: Element,
  ) {
    const [x = 0, y = 0, width = 0, height = 0] = (this.getAttribute('data-box') ?? '')
      .split(' ')
      .map(Number);
    const box = { x, y, width, height, left: x, top: y, right: x + width, bottom: y + height };
    return { ...box, toJSON: () => box };
  });
}
afterEach(() => void vi.restoreAllMocks());

const TWO_GAPS = `
  <div data-run data-box="0 0 400 200">
    <i data-gap-open="a" data-box="100 0 100 200"></i>
    <i data-gap-open="b" data-box="300 0 100 200"></i>
  </div>`;

it('tells the gap at a point, up to its edges, and what scrolls there', () => {
  page(TWO_GAPS);
  const under = createUnderPointer(() => 1);
  const gapAt = (x: number) => under.at({ x, y: 50 }).gap;
  expect([99, 100, 199, 200].map(gapAt)).toEqual([null, 'a', 'a', null]);
  expect([299, 300, 399, 400].map(gapAt)).toEqual([null, 'b', 'b', null]);
  expect(under.at({ x: 250, y: 50 }).run).toBe(document.querySelector('[data-run]'));
  expect(under.at({ x: 250, y: 250 }).run).toBeNull();
});

it('tells nothing of what a bar lies over, and the gap of the bar itself', () => {
  page(`${TWO_GAPS}<footer data-cover data-box="0 150 400 50">
    <i data-gap-open="bench" data-box="0 150 200 50"></i></footer>`);
  const under = createUnderPointer(() => 1);
  expect(under.at({ x: 150, y: 149 }).gap).toBe('a');
  expect(under.at({ x: 150, y: 160 })).toEqual({ gap: 'bench', run: null });
  expect(under.at({ x: 350, y: 160 })).toEqual({ gap: null, run: null });
});

it('measures once while nothing changes, anew after a scroll, and seldom while gaps open', () => {
  const measure = page(TWO_GAPS);
  let opened = 1;
  const under = createUnderPointer(() => opened);
  const frames = (count: number) => {
    measure.mockClear();
    for (let frame = 0; frame < count; frame += 1) under.at({ x: 0, y: 0 });
    return measure.mock.calls.length;
  };
  const once = frames(1);
  expect(once).toBeGreaterThan(0);
  expect(frames(10)).toBe(0);
  under.forget();
  expect(frames(10)).toBe(once);

  measure.mockClear();
  for (let frame = 0; frame < 12; frame += 1) {
    opened += 1;
    under.at({ x: 0, y: 0 });
  }
  expect(measure.mock.calls.length / once).toBeLessThanOrEqual(2);
  expect(frames(3)).toBe(once);
});
