/** Where the plot stands in its drawing, px. */
export interface Frame {
  width: number;
  height: number;
  left: number;
  right: number;
  top: number;
  bottom: number;
}

export const WIDE: Frame = { width: 640, height: 372, left: 50, right: 588, top: 22, bottom: 334 };
export const NARROW: Frame = {
  width: 352,
  height: 300,
  left: 44,
  right: 304,
  top: 22,
  bottom: 264,
};
export const TEXT = 'fill-ink2 text-[13.5px]';

export type ToX = (day: number) => number;
export type ToY = (value: number) => number;
