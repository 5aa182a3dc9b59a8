import type { Point } from '../geometry/point.ts';
import { type Motion, moved } from '../geometry/motion.ts';
import { type Shape, boxOf, gap } from './layout.ts';
import type { Paper } from './papers.ts';
import { type Lattice, type PhaseGroup, phaseGroups } from './phases.ts';
import { type Raster, rasterOf } from './piece-raster.ts';
import { type SheetEdges, tileGrid } from './tile-grid.ts';
import { mostAcross } from './tile-zones.ts';

/** Where pieces may be laid: sheets side by side and below one another. */
export type Field = {
  readonly lattice: Lattice;
  readonly columns: number;
  readonly rows: number;
  /** A roll is as long as its last piece reaches; else sheets without ink are left out. */
  readonly asLong: boolean;
};

/** A shape turned some way, on squared paper, with its places on a sheet. */
export type Turned = {
  readonly motion: Motion;
  readonly raster: Raster;
  readonly groups: readonly FieldGroup[];
  /** The fewest sheets it takes alone. */
  readonly alone: number;
};

/** Places of a piece with what is asked of them most often, in the field's own numbers. */
export type FieldGroup = PhaseGroup & {
  /** Its sheets, counted row by row from the one it starts on. */
  readonly offsets: Int32Array;
  readonly needs: Int32Array;
};

/** Side of a cell: small against the room that pieces leave, mm; on large sheets a part of the sheet. */
const cellSide = 5;
const cellsAtMost = 64;

/** Width of a cutting table, mm, as long as no piece needs more. */
const tableWidth = 1900;

/** A roll is counted in strips of this length, mm: what is saved below that is not worth a move. */
const strip = 25;

const stride = (step: number, overlap: number) => {
  const cells = Math.max(1, Math.round(step / Math.max(cellSide, step / cellsAtMost)));
  return { step, overlap, cells };
};

const latticeOf = (across: Lattice['across'], down: Lattice['down']): Pick<Field, 'lattice'> => ({
  lattice: {
    across,
    down,
    cell: { x: across.step / across.cells, y: down.step / down.cells },
  },
});

/** The sheets of a paper over a table wide enough for every piece, and rows enough for all of them. */
export function sheetField(shapes: readonly Shape[], paper: Paper, edges: SheetEdges): Field {
  const { step, overlap } = tileGrid({ width: 0, height: 0 }, paper, edges);
  const boxes = shapes.map(({ chain }) => boxOf(chain));
  const narrow = Math.max(...boxes.map(({ width, height }) => Math.min(width, height)));
  const long = boxes.reduce(
    (sum, { width, height }) => sum + Math.ceil(Math.max(width, height) / step.y) + 1,
    0,
  );
  return {
    ...latticeOf(stride(step.x, overlap), stride(step.y, overlap)),
    columns: Math.max(1, Math.floor(tableWidth / step.x), Math.ceil(narrow / step.x) + 1),
    rows: long,
    asLong: false,
  };
}

/** One strip of a roll, as long as the roll is printed at most. */
export function rollField(paper: Paper, edges: SheetEdges): Field {
  const { use } = tileGrid({ width: 0, height: 0 }, paper, edges);
  return {
    ...latticeOf(stride(use.width, 0), stride(strip, 0)),
    columns: 1,
    rows: Math.floor(use.height / strip),
    asLong: true,
  };
}

const quarters = [
  { cos: 1, sin: 0 },
  { cos: 0, sin: 1 },
  { cos: -1, sin: 0 },
  { cos: 0, sin: -1 },
] as const;

/** The ways of laying a shape, each quarter turn with its cells; none so wide that its sheets cannot be counted. */
export function turnsOf(shape: Shape, { lattice, columns }: Field): readonly Turned[] {
  return (shape.upright ? quarters.slice(0, 1) : quarters).flatMap((quarter) => {
    const turn: Motion = { ...quarter, dx: 0, dy: 0 };
    const chain = shape.chain.map((each) => moved(each, turn));
    const box = boxOf(chain);
    if (box.width > mostAcross * lattice.across.step) return [];
    const onCorner = chain.map((each): Point => ({ x: each.x - box.x, y: each.y - box.y }));
    const raster = rasterOf(onCorner, box, lattice.cell, gap / 2);
    const motion = { ...turn, dx: -box.x, dy: -box.y };
    const groups = phaseGroups(raster, lattice).map((group) => ({
      ...group,
      offsets: Int32Array.from(group.sheets, (each) => each.row * columns + each.column),
      needs: Int32Array.from(group.least),
    }));
    return [
      { motion, raster, groups, alone: Math.min(...groups.map((each) => each.sheets.length)) },
    ];
  });
}
