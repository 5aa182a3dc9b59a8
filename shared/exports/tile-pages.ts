import { shift } from '../geometry/motion.ts';
import { type Box, boxOf, placedChain } from '../sheets/layout.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import { overlap, printerMargin } from '../sheets/tile-grid.ts';
import type { Tile, TilePlan } from '../sheets/tile-plan.ts';
import type { Mark } from './drawing.ts';
import { words } from './marks.ts';

const left = printerMargin;
const top = printerMargin;

const still = shift(0, 0);
const use = (drawing: string): Mark => ({ kind: 'use', drawing, motion: still });

/** What one edge of a sheet shows where a neighbour is printed: shared marks, and its name beside them. */
type EdgeMarks = { readonly marks: Mark; readonly name: Mark };

/** The edges of a sheet that have a neighbour; names stand between two match marks, clear of both. */
function edgeMarks({ neighbours }: Tile, { use: area }: TilePlan): readonly EdgeMarks[] {
  const [upright, level] = [top + area.height / 2 - 40, left + area.width / 2 - 25];
  const named = (text: string, x: number, y: number, turn: number): Mark =>
    words(text, x, y, 2.8, { anchor: 'middle', grey: 0.3, turn });
  const { right, below, left: before, above } = neighbours;
  const strip = overlap / 2 - 1;
  return [
    right && {
      marks: use('glue-right'),
      name: named(`glue under ${right}`, left + area.width - strip, upright, -90),
    },
    below && {
      marks: use('glue-below'),
      name: named(`glue under ${below}`, level, top + area.height - strip, 0),
    },
    before && {
      marks: use('trim-left'),
      name: named(`trim, lay on ${before}`, left + 3.6, upright, -90),
    },
    above && {
      marks: use('trim-above'),
      name: named(`trim, lay on ${above}`, level, top + 3.6, 0),
    },
  ].flatMap((each) => each || []);
}

/** The name of a sheet, large and pale under the lines. */
const nameMark = ({ name }: Tile): Mark =>
  words(name, left + 14, top + 28, 20, { heavy: true, grey: 0.85 });

/** On a sheet with no line on it: which piece it is the inside of. */
const insideMark = (piece: string, area: TilePlan['use']): Mark =>
  words(`inside ${piece}`, left + area.width / 2, top + area.height / 2, 6, {
    anchor: 'middle',
    grey: 0.5,
  });

/** Whether a box, and the breadth of a line round it, reaches into a tile's window. */
const showsIn = (box: Box, { at }: Tile, area: TilePlan['use']): boolean =>
  box.x - 1 < at.x + area.width &&
  box.x + box.width + 1 > at.x &&
  box.y - 1 < at.y + area.height &&
  box.y + box.height + 1 > at.y;

/**
 * The pages of a tile plan, in its order: each shows its window of the drawing, the sheet's name, its
 * neighbours' names, the strip to glue under and match marks that land on both sheets of a seam.
 */
export function drawTiles(
  { layout, plan }: SheetPlan,
  titles: ReadonlyMap<string, string>,
  legend: string,
): readonly (readonly Mark[])[] {
  const laid = layout.placements.map((each) => ({ ...each, box: boxOf(placedChain(each)) }));
  return plan.tiles.map((tile, order) => {
    const edges = edgeMarks(tile, plan);
    const pieces = laid
      .filter(({ box }) => showsIn(box, tile, plan.use))
      .map(({ shape, motion }): Mark => {
        const [dx, dy] = [motion.dx + left - tile.at.x, motion.dy + top - tile.at.y];
        return { kind: 'use', drawing: shape.piece, motion: { ...motion, dx, dy } };
      });
    const inside = tile.inside && insideMark(titles.get(tile.inside) ?? tile.inside, plan.use);
    const foot = top + plan.use.height - overlap / 2 + 1;
    return [
      {
        kind: 'window',
        box: { x: left, y: top, ...plan.use },
        marks: [
          nameMark(tile),
          ...pieces,
          ...(inside ? [inside] : []),
          ...edges.map((each) => each.marks),
        ],
      },
      use('frame'),
      ...edges.map((each) => each.name),
      words(`${legend} · sheet ${order + 1} of ${plan.tiles.length}`, left + 3, foot, 2.4, {
        grey: 0.3,
      }),
    ];
  });
}
