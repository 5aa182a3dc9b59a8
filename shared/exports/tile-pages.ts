import { shift } from '../geometry/motion.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import { overlap, printerMargin } from '../sheets/tile-grid.ts';
import type { Tile, TilePlan } from '../sheets/tile-plan.ts';
import { point } from '../geometry/point.ts';
import type { Drawing, Mark, Window } from './drawing.ts';
import { boxOf, placedChain } from '../sheets/layout.ts';
import { box, chainOf, outline, pens, stroke, strokes, words } from './marks.ts';

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

const small = { anchor: 'middle', grey: 0.3 } as const;
const still = shift(0, 0);

function edgeMarks({ neighbours }: Tile, { use }: TilePlan): { within: Mark[]; over: Mark[] } {
  const [midX, midY] = [left + use.width / 2, top + use.height / 2];
  const within: Mark[] = [];
  const over: Mark[] = [];
  if (neighbours.right) {
    within.push({ kind: 'use', drawing: 'glue-right', motion: still });
    over.push(
      words(`glue under ${neighbours.right}`, left + use.width - overlap / 2 + 1, midY - 40, 2.8, {
        ...small,
        turn: -90,
      }),
    );
  }
  if (neighbours.below) {
    within.push({ kind: 'use', drawing: 'glue-below', motion: still });
    over.push(
      words(
        `glue under ${neighbours.below}`,
        midX - 25,
        top + use.height - overlap / 2 + 1,
        2.8,
        small,
      ),
    );
  }
  if (neighbours.left) {
    within.push({ kind: 'use', drawing: 'trim-left', motion: still });
    over.push(
      words(`trim, lay on ${neighbours.left}`, left + 3.6, midY - 40, 2.8, { ...small, turn: -90 }),
    );
  }
  if (neighbours.above) {
    within.push({ kind: 'use', drawing: 'trim-above', motion: still });
    over.push(words(`trim, lay on ${neighbours.above}`, midX - 25, top + 3.6, 2.8, small));
  }
  return { within, over };
}

/** The name of a sheet, large and pale under the lines. */
const nameMark = (tile: Tile): Mark =>
  words(tile.name, left + 14, top + 28, 20, { heavy: true, grey: 0.85 });

/**
 * The pages of a tile plan, in its order: each shows its window of the drawing, the sheet's name, its
 * neighbours' names, the strip to glue under and match marks that land on both sheets of a seam.
 */
export function drawTiles(
  { layout, plan }: SheetPlan,
  titles: ReadonlyMap<string, string>,
  legend: string,
): readonly (readonly Mark[])[] {
  const boxes = layout.placements.map((each) => boxOf(placedChain(each)));
  const { use, tiles } = plan;
  return tiles.map((tile, order) => {
    const { within, over } = edgeMarks(tile, plan);
    const seen = layout.placements.filter((_, index) => {
      const each = boxes[index];
      return (
        each !== undefined &&
        each.x - 1 < tile.at.x + use.width &&
        each.x + each.width + 1 > tile.at.x &&
        each.y - 1 < tile.at.y + use.height &&
        each.y + each.height + 1 > tile.at.y
      );
    });
    const window: Window = {
      kind: 'window',
      box: { x: left, y: top, width: use.width, height: use.height },
      marks: [
        nameMark(tile),
        ...seen.map(({ shape, motion }) => ({
          kind: 'use' as const,
          drawing: shape.piece,
          motion: { ...motion, dx: motion.dx + left - tile.at.x, dy: motion.dy + top - tile.at.y },
        })),
        ...(tile.inside === undefined
          ? []
          : [
              words(
                `inside ${titles.get(tile.inside) ?? tile.inside}`,
                left + use.width / 2,
                top + use.height / 2,
                6,
                { anchor: 'middle', grey: 0.5 },
              ),
            ]),
        ...within,
      ],
    };
    return [
      window,
      { kind: 'use', drawing: 'frame', motion: still },
      ...over,
      words(
        `${legend} · sheet ${order + 1} of ${tiles.length}`,
        left + 3,
        top + use.height - overlap / 2 + 1,
        2.4,
        { grey: 0.3 },
      ),
    ];
  });
}
