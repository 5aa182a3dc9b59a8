import { shift } from '../geometry/motion.ts';
import { point } from '../geometry/point.ts';
import type { DrawnPiece } from '../sheets/drawn-pieces.ts';
import type { Box } from '../sheets/layout.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import { type Tile, type TilePlan, printedTiles } from '../sheets/tile-plan.ts';
import type { Mark, Words } from './drawing.ts';
import { notToCut } from './line-style.ts';
import { area, words } from './marks.ts';
import { linesOf, smallSquare, smallSquareAt } from './small-square.ts';
import { typeWidth } from './type-width.ts';

const still = shift(0, 0);
const use = (drawing: string): Mark => ({ kind: 'use', drawing, motion: still });

/** What one edge of a sheet shows where a neighbour is printed: shared marks, and its name beside them. */
type EdgeMarks = { readonly marks?: Mark; readonly name: Mark };

/** The edges of a sheet that have a neighbour; names stand between two match marks, clear of both. */
function edgeMarks({ neighbours, glued }: Tile, plan: TilePlan): readonly EdgeMarks[] {
  const { use: page, margin, overlap } = plan;
  const [upright, level] = [margin + page.height * 0.35, margin + page.width * 0.35];
  const named = (text: string, x: number, y: number, turn: number): Mark =>
    words(text, x, y, 2.8, { anchor: 'middle', grey: 0.3, turn });
  const strip = overlap / 2 - 1;
  const places = {
    right: { x: margin + page.width - strip, y: upright, turn: -90 },
    below: { x: level, y: margin + page.height - strip, turn: 0 },
    left: { x: margin + 3.6, y: upright, turn: -90 },
    above: { x: level, y: margin + 3.6, turn: 0 },
  } as const;
  const ways = [
    { side: 'right', drawing: 'glue-right', text: 'glue under' },
    { side: 'below', drawing: 'glue-below', text: 'glue under' },
    { side: 'left', drawing: 'trim-left', text: 'trim, lay on' },
    { side: 'above', drawing: 'trim-above', text: 'trim, lay on' },
  ] as const;
  return ways.flatMap(({ side, drawing, text }): readonly EdgeMarks[] => {
    const neighbour = neighbours[side];
    if (neighbour === undefined) return [];
    const { x, y, turn } = places[side];
    return glued.includes(side)
      ? [{ marks: use(drawing), name: named(`${text} ${neighbour}`, x, y, turn) }]
      : [{ name: named(`beside ${neighbour}, no glue`, x, y, turn) }];
  });
}

/** The box of that name, on the drawing. */
const nameBox = ({ at }: Tile): Box => ({ x: at.x + 13, y: at.y + 12, width: 26, height: 18 });

/** The name of a sheet, large and pale under the lines; small where ink is saved. */
const nameMark = ({ name }: Tile, { margin }: TilePlan, inkSaving: boolean): Mark =>
  inkSaving
    ? words(name, margin + 14, margin + 14, 6, { grey: 0.5 })
    : words(name, margin + 14, margin + 28, 20, { heavy: true, grey: 0.85 });

/** On a sheet with no line on it: which piece it is the inside of. */
const insideMark = (piece: string, { use: page, margin }: TilePlan): Mark =>
  words(`inside ${piece}`, margin + page.width / 2, margin + page.height / 2, 6, {
    anchor: 'middle',
    grey: 0.5,
  });

/** Whether a box, and the breadth of a line round it, reaches into a tile's window. */
const showsIn = (box: Box, { at }: Tile, page: TilePlan['use']): boolean =>
  box.x - 1 < at.x + page.width &&
  box.x + box.width + 1 > at.x &&
  box.y - 1 < at.y + page.height &&
  box.y + box.height + 1 > at.y;

/** The box of a line of lettering, a little generous: the heavy face is wider than the light one. */
const boxOfWords = ({ text, at, size }: Words): Box => ({
  x: at.x,
  y: at.y - size,
  width: typeWidth(text, size) * 1.12,
  height: size * 1.4,
});

/** What is written over a sheet whose drawing is not at true scale, or nothing. */
function warning(sheets: SheetPlan): readonly Mark[] {
  const text = notToCut(sheets.order);
  if (text === undefined) return [];
  const { use: page, margin } = sheets.plan;
  const [middle, half] = [margin + page.width / 2, typeWidth(text, 5) * 0.56];
  const [top, foot] = [margin + 4, margin + 10.5];
  const paper = area(
    1,
    point(middle - half, top),
    point(middle + half, top),
    point(middle + half, foot),
    point(middle - half, foot),
  );
  return [paper, words(text, middle, margin + 9, 5, { anchor: 'middle', heavy: true })];
}

/**
 * The pages of the printed tiles of a plan, in its order: each shows its window of the drawing, the sheet's
 * name, its neighbours' names, the strip to glue under, match marks that land on both sheets of a seam, and
 * a small square to measure, clear of the lines of the pieces `drawn`.
 */
export function drawTiles(
  sheets: SheetPlan,
  titles: ReadonlyMap<string, string>,
  labels: readonly Words[],
  legend: string,
  drawn: ReadonlyMap<string, DrawnPiece> = new Map(),
): readonly (readonly Mark[])[] {
  const { layout, plan, order } = sheets;
  const { margin, overlap, use: page } = plan;
  const lines = layout.placements.map((each) => linesOf(each, drawn.get(each.shape.piece)));
  const lettered = labels.map((each) => ({ each, box: boxOfWords(each) }));
  const tiles = printedTiles(plan);
  return tiles.map((tile, number) => {
    const edges = edgeMarks(tile, plan);
    const [right, down] = [margin - tile.at.x, margin - tile.at.y];
    const pieces = tile.shows.flatMap((which): readonly Mark[] => {
      const placement = layout.placements[which];
      if (!placement) return [];
      const { shape, motion } = placement;
      const by = { ...motion, dx: motion.dx + right, dy: motion.dy + down };
      return [{ kind: 'use', drawing: shape.piece, motion: by }];
    });
    const here = lettered.filter(({ box }) => showsIn(box, tile, page));
    const names = here.map(({ each }): Mark => ({
      ...each,
      at: { x: each.at.x + right, y: each.at.y + down },
    }));
    const square = smallSquareAt(
      tile,
      plan,
      tile.shows.flatMap((which) => lines[which] ?? []),
      [...here.map(({ box }) => box), ...(order.inkSaving ? [] : [nameBox(tile)])],
    );
    const title = tile.inside && (titles.get(tile.inside) ?? tile.inside);
    const foot = margin + page.height - overlap / 2 + 1;
    return [
      {
        kind: 'window',
        box: { x: margin, y: margin, ...page },
        marks: [
          nameMark(tile, plan, order.inkSaving),
          ...pieces,
          ...names,
          ...(title === undefined ? [] : [insideMark(title, plan)]),
          ...edges.flatMap((each) => each.marks ?? []),
        ],
      },
      use('frame'),
      {
        kind: 'use',
        drawing: smallSquare.name,
        motion: shift(margin + square.x, margin + square.y),
      },
      ...edges.map((each) => each.name),
      ...warning(sheets),
      words(`${legend} · sheet ${number + 1} of ${tiles.length}`, margin + 3, foot, 2.4, {
        grey: 0.3,
      }),
    ];
  });
}
