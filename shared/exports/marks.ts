import { line, type Path } from '../geometry/path.ts';
import { type Point, point } from '../geometry/point.ts';
import type { Area, Pen, Strokes, Words } from './drawing.ts';

/** Pens of the trade's lines on paper, mm; told apart by their dashes, never by colour. */
export const pens = {
  cut: { width: 0.5 },
  seam: { width: 0.3, dash: [4, 2] },
  dart: { width: 0.25 },
  notch: { width: 0.4 },
  grain: { width: 0.35 },
  fold: { width: 0.35 },
  hairline: { width: 0.18, grey: 0.35 },
  trim: { width: 0.15, grey: 0.45 },
  frame: { width: 0.25 },
} as const satisfies Record<string, Pen>;

/** A straight stroke from one place to another. */
export const stroke = (fromX: number, fromY: number, toX: number, toY: number): Path => [
  line(point(fromX, fromY), point(toX, toY)),
];

/** A chain of straight strokes; closed by its pen, not by a last stroke. */
export const chainOf = (corners: readonly Point[]): Path =>
  corners.slice(1).map((to, before) => line(corners[before] ?? to, to));

export const strokes = (pen: Pen, ...paths: readonly Path[]): Strokes => ({
  kind: 'strokes',
  paths,
  pen,
});

export const outline = (pen: Pen, ...paths: readonly Path[]): Strokes => ({
  kind: 'strokes',
  paths,
  pen,
  closed: true,
});

export const box = (pen: Pen, x: number, y: number, width: number, height: number): Strokes =>
  outline(
    pen,
    chainOf([point(x, y), point(x + width, y), point(x + width, y + height), point(x, y + height)]),
  );

export const area = (grey: number, ...corners: readonly Point[]): Area => ({
  kind: 'area',
  corners,
  grey,
});

/** Lettering at a place; look and turn as given. */
export const words = (
  text: string,
  x: number,
  y: number,
  size: number,
  look: Omit<Words, 'kind' | 'text' | 'at' | 'size'> = {},
): Words => ({ kind: 'words', text, at: point(x, y), size, ...look });
