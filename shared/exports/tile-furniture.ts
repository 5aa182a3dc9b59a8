import { point } from '../geometry/point.ts';
import { overlap, printerMargin } from '../sheets/tile-grid.ts';
import type { TilePlan } from '../sheets/tile-plan.ts';
import type { Drawing, Mark } from './drawing.ts';
import { box, chainOf, outline, pens, stroke, strokes } from './marks.ts';

/** Half the breadth of a match mark, mm; it stands on the line where the next sheet begins. */
const lozenge = 4;

/** Shares of an edge at which its match marks stand. */
const marked = [0.2, 0.5, 0.8];

const left = printerMargin;
const top = printerMargin;

const lozengeAt = (x: number, y: number): Mark =>
  outline(
    pens.frame,
    chainOf([
      point(x, y - lozenge),
      point(x + lozenge, y),
      point(x, y + lozenge),
      point(x - lozenge, y),
    ]),
  );

const crossAt = (x: number, y: number): Mark =>
  strokes(
    pens.trim,
    stroke(x - lozenge, y, x + lozenge, y),
    stroke(x, y - lozenge, x, y + lozenge),
  );

/** The strip that goes under the next sheet, with the line where that sheet begins. */
function gluedRight({ use }: TilePlan): Drawing {
  const x = left + use.width - overlap;
  const rungs = marked.map((share) => top + share * use.height);
  return {
    name: 'glue-right',
    marks: [
      strokes(pens.trim, stroke(x, top, x, top + use.height)),
      ...rungs.flatMap((y) => [lozengeAt(x, y), crossAt(x, y)]),
    ],
  };
}

function gluedBelow({ use }: TilePlan): Drawing {
  const y = top + use.height - overlap;
  const rungs = marked.map((share) => left + share * use.width);
  return {
    name: 'glue-below',
    marks: [
      strokes(pens.trim, stroke(left, y, left + use.width, y)),
      ...rungs.flatMap((x) => [lozengeAt(x, y), crossAt(x, y)]),
    ],
  };
}

/** The same marks where they land on the sheet that is laid on top: halves, cut by its trim line. */
const trimmedLeft = ({ use }: TilePlan): Drawing => ({
  name: 'trim-left',
  marks: marked
    .map((share) => top + share * use.height)
    .flatMap((y) => [lozengeAt(left, y), crossAt(left, y)]),
});

const trimmedAbove = ({ use }: TilePlan): Drawing => ({
  name: 'trim-above',
  marks: marked
    .map((share) => left + share * use.width)
    .flatMap((x) => [lozengeAt(x, top), crossAt(x, top)]),
});

/** The trim line round the printed area, with heavier corners to lay a ruler on. */
function frame({ use }: TilePlan): Drawing {
  const [right, bottom, arm] = [left + use.width, top + use.height, 8];
  const corner = (x: number, y: number, dx: number, dy: number): Mark =>
    strokes({ width: 0.4 }, chainOf([point(x + dx * arm, y), point(x, y), point(x, y + dy * arm)]));
  return {
    name: 'frame',
    marks: [
      box(pens.trim, left, top, use.width, use.height),
      corner(left, top, 1, 1),
      corner(right, top, -1, 1),
      corner(left, bottom, 1, -1),
      corner(right, bottom, -1, -1),
    ],
  };
}

/** The drawings that many tiles of a plan share. */
export const tileFurniture = (plan: TilePlan): readonly Drawing[] => [
  frame(plan),
  gluedRight(plan),
  gluedBelow(plan),
  trimmedLeft(plan),
  trimmedAbove(plan),
];
