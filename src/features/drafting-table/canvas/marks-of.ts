import type { Pen } from '#shared/exports/drawing.ts';
import { chainOf, pens } from '#shared/exports/marks.ts';
import { drawPiece } from '#shared/exports/piece-drawing.ts';
import type { Point } from '#shared/geometry/point.ts';

import type { Colours } from './colours.ts';
import type { Layout } from './layout.ts';
import { resized, traced, type Line } from './trace.ts';

/** An arrowhead as it is printed, its tip first, and where its piece lies. */
export type Arrowhead = { readonly corners: readonly Point[]; readonly at: Point };

type Marks = {
  readonly strokes: ReadonlyMap<Pen, readonly Line[]>;
  readonly arrowheads: readonly Arrowhead[];
};

/**
 * The trade's marks inside all pieces, those of one pen together. The outlines are not among them: they
 * are drawn edge by edge, so that they can be pointed at.
 */
export function marksOf(layout: Layout, allowances: boolean): Marks {
  const strokes = new Map<Pen, Line[]>();
  const arrowheads: Arrowhead[] = [];
  for (const { piece, at } of layout.placed) {
    for (const mark of drawPiece(piece).marks) {
      if (mark.kind === 'area') {
        arrowheads.push({ corners: mark.corners, at });
      }
      if (mark.kind !== 'strokes' || mark.pen === pens.cut || mark.pen === pens.seam) continue;
      // Notches start at the cutting line: without it they would stand beside the piece.
      if (!allowances && mark.pen === pens.notch) continue;
      const lines = mark.paths.map((each) => traced(each, at, mark.closed === true));
      strokes.set(mark.pen, [...(strokes.get(mark.pen) ?? []), ...lines]);
    }
  }
  return { strokes, arrowheads };
}

/** An arrowhead's outline at so many pixels a millimetre. */
export function headLine({ corners, at }: Arrowhead, scale: number): Line {
  const sized = resized(corners, scale);
  return traced(chainOf([...sized, ...sized.slice(0, 1)]), at, true);
}

/** A printing pen on screen: its greys become the page's colours, its millimetres pixels. */
export const shown = ({ grey, dash, width }: Pen, colours: Colours) => ({
  colour: grey === undefined ? colours.ink : grey === 1 ? colours.paper : colours.slate,
  width: Math.max(0.8, width * 2.5),
  ...(dash === undefined ? {} : { dash }),
});
