import { point } from '../geometry/point.ts';
import type { TilePlan } from '../sheets/tile-plan.ts';
import type { Drawing, Mark } from './drawing.ts';
import { box, chainOf, outline, pens, stroke, strokes } from './marks.ts';
import { smallSquare } from './small-square.ts';

/** How sheets are dressed, beside what the plan says. */
export type Dress = {
  readonly glueMarks: boolean;
  readonly inkSaving: boolean;
};

/** Half the breadth of a match mark, mm; it stands on the line where the next sheet begins. */
const lozenge = 4;

/** Shares of an edge at which its match marks stand. */
const marked = [0.2, 0.5, 0.8];

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

/** A match mark: the lozenge with its cross, or the cross alone where ink is saved. */
const matchAt = (x: number, y: number, { inkSaving }: Dress): readonly Mark[] =>
  inkSaving ? [crossAt(x, y)] : [lozengeAt(x, y), crossAt(x, y)];

/** Where the match marks along an edge of a sheet stand, mm from its corner. */
const along = (length: number): readonly number[] => marked.map((share) => share * length);

/** The strip that goes under the next sheet, with the line where that sheet begins. */
function gluedRight({ use, margin, overlap }: TilePlan, dress: Dress): Drawing {
  const x = margin + use.width - overlap;
  return {
    name: 'glue-right',
    marks: [
      strokes(pens.trim, stroke(x, margin, x, margin + use.height)),
      ...(dress.glueMarks ? along(use.height).flatMap((y) => matchAt(x, margin + y, dress)) : []),
    ],
  };
}

function gluedBelow({ use, margin, overlap }: TilePlan, dress: Dress): Drawing {
  const y = margin + use.height - overlap;
  return {
    name: 'glue-below',
    marks: [
      strokes(pens.trim, stroke(margin, y, margin + use.width, y)),
      ...(dress.glueMarks ? along(use.width).flatMap((x) => matchAt(margin + x, y, dress)) : []),
    ],
  };
}

/** The same marks where they land on the sheet that is laid on top: halves, cut by its trim line. */
const trimmedLeft = ({ use, margin }: TilePlan, dress: Dress): Drawing => ({
  name: 'trim-left',
  marks: dress.glueMarks
    ? along(use.height).flatMap((y) => matchAt(margin, margin + y, dress))
    : [],
});

const trimmedAbove = ({ use, margin }: TilePlan, dress: Dress): Drawing => ({
  name: 'trim-above',
  marks: dress.glueMarks ? along(use.width).flatMap((x) => matchAt(margin + x, margin, dress)) : [],
});

/** The trim line round the printed area, with heavier corners to lay a ruler on. */
function frame({ use, margin }: TilePlan): readonly Mark[] {
  const [right, bottom, arm] = [margin + use.width, margin + use.height, 8];
  const corner = (x: number, y: number, dx: number, dy: number): Mark =>
    strokes({ width: 0.4 }, chainOf([point(x + dx * arm, y), point(x, y), point(x, y + dy * arm)]));
  return [
    box(pens.trim, margin, margin, use.width, use.height),
    corner(margin, margin, 1, 1),
    corner(right, margin, -1, 1),
    corner(margin, bottom, 1, -1),
    corner(right, bottom, -1, -1),
  ];
}

/** The drawings that many tiles of a plan share. */
export const tileFurniture = (plan: TilePlan, dress: Dress): readonly Drawing[] => [
  { name: 'frame', marks: frame(plan) },
  smallSquare,
  gluedRight(plan, dress),
  gluedBelow(plan, dress),
  trimmedLeft(plan, dress),
  trimmedAbove(plan, dress),
];
