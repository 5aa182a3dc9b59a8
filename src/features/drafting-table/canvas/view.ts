import type { Point } from '#shared/geometry/point.ts';

/** How the drafting paper is looked at: pixels a millimetre, and where the paper's origin lies. */
export type View = { readonly scale: number; readonly x: number; readonly y: number };

export type Size = { readonly width: number; readonly height: number };

export type Box = {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
};

/**
 * Room the rod and the tools keep free of pieces when the drawing is fitted; on a phone the names of small
 * pieces stand above them.
 */
const insetOf = ({ width }: Size, place: Place) => ({
  left: 40,
  top: width > 560 || place === 'middle' ? 40 : 66,
  right: 16,
  bottom: 60,
});

/** Width over height of a canvas, in halves: pieces are not laid anew at every pixel a window is drawn. */
export const aspectOf = ({ width, height }: Size): number =>
  height > 0 ? Math.max(0.5, Math.round((2 * width) / height) / 2) : 1;

const leastScale = 0.02;
const mostScale = 8;

export const toScreen = (view: View, at: Point): Point => ({
  x: at.x * view.scale + view.x,
  y: at.y * view.scale + view.y,
});

export const toPaper = (view: View, at: Point): Point => ({
  x: (at.x - view.x) / view.scale,
  y: (at.y - view.y) / view.scale,
});

/** Where a box that does not fill the canvas lies: under the rod's corner, or in the middle. */
export type Place = 'corner' | 'middle';

/** The view in which a box on the paper just fills the canvas. */
export function fitted(box: Box, size: Size, place: Place): View {
  const inset = insetOf(size, place);
  const spare = place === 'corner' ? 0 : 0.5;
  const width = Math.max(40, size.width - inset.left - inset.right);
  const height = Math.max(40, size.height - inset.top - inset.bottom);
  const scale = held(
    Math.min(width / (box.right - box.left || 1), height / (box.bottom - box.top || 1)),
  );
  return {
    scale,
    x: inset.left + (width - (box.right - box.left) * scale) * spare - box.left * scale,
    y: inset.top + (height - (box.bottom - box.top) * scale) * spare - box.top * scale,
  };
}

/** The view nearer or further by a factor, with the given pixel staying where it is. */
export function zoomed(view: View, by: number, at: Point): View {
  const scale = held(view.scale * by);
  const ratio = scale / view.scale;
  return { scale, x: at.x - (at.x - view.x) * ratio, y: at.y - (at.y - view.y) * ratio };
}

export const panned = (view: View, by: Point): View => ({
  ...view,
  x: view.x + by.x,
  y: view.y + by.y,
});

const held = (scale: number): number => Math.min(mostScale, Math.max(leastScale, scale));
