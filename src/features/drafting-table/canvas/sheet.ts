import paper, { type Item, type Layer } from 'paper/dist/paper-core.js';

import type { EdgeRef } from '#shared/drafting/piece.ts';
import type { Path } from '#shared/geometry/path.ts';
import type { Point } from '#shared/geometry/point.ts';

import type { Colours } from './colours.ts';
import type { Layout } from './layout.ts';
import { headLine, marksOf, shown, type Arrowhead } from './marks-of.ts';
import { straight, traced, type Line } from './trace.ts';
import type { Size, View } from './view.ts';

/** Lines that stand out: two edges lit as one, what a step drew, where a proof line fails. */
export type Lit = {
  readonly seams: readonly EdgeRef[];
  readonly faults: readonly EdgeRef[];
  readonly lines: readonly { readonly path: Path; readonly at: Point }[];
};

/** The canvas the pieces are drawn on. */
export type Sheet = {
  draw(layout: Layout, options: { readonly colours: Colours; readonly allowances: boolean }): void;
  light(layout: Layout, lit: Lit, colours: Colours): void;
  look(view: View): void;
  resize(size: Size): void;
  /** The edge within reach of a place on the paper, the nearest piece's first. */
  seamAt(at: Point, reach: number): EdgeRef | undefined;
  close(): void;
};

type Stroke = {
  readonly colour: string;
  readonly width: number;
  readonly dash?: readonly number[];
};

/** Lays a sheet on a canvas. Lines keep their width at every zoom. */
export function laySheet(canvas: HTMLCanvasElement): Sheet {
  const scope = new paper.PaperScope();
  scope.setup(canvas);
  scope.view.autoUpdate = false;
  const pieces = new scope.Layer();
  const arrows = new scope.Layer();
  const lights = new scope.Layer();
  // Only now: a layer, unlike the items in it, has to be inserted into its project.
  scope.settings.insertItems = false;

  const pathOf = ({ segments, closed }: Line): Item => {
    const path = new scope.Path(segments);
    path.closed = closed;
    return path;
  };
  const lay = (layer: Layer, item: Item, { colour, width, dash }: Stroke): void => {
    item.strokeColor = colour;
    item.strokeWidth = width;
    item.strokeScaling = false;
    item.strokeJoin = 'round';
    if (dash !== undefined) item.dashArray = dash;
    layer.addChild(item);
  };
  /** Lines that share a stroke are one item: paper takes its time over every item. */
  const layAll = (layer: Layer, lines: readonly Line[], stroke: Stroke): void => {
    if (lines.length > 0) lay(layer, new scope.CompoundPath(lines.map(pathOf)), stroke);
  };

  let arrowheads: { readonly heads: readonly Arrowhead[]; readonly colour: string } | undefined;
  let scaled: { readonly of: unknown; readonly scale: number } | undefined;
  /** Arrowheads are laid anew where the paper is looked at from nearer or further: they keep their size on screen. */
  const layArrowheads = (scale: number): void => {
    if (arrowheads === undefined || (scaled?.of === arrowheads && scaled.scale === scale)) return;
    scaled = { of: arrowheads, scale };
    arrows.removeChildren();
    const { heads, colour } = arrowheads;
    if (heads.length === 0) return;
    const item = new scope.CompoundPath(heads.map((each) => pathOf(headLine(each, scale))));
    item.fillColor = colour;
    arrows.addChild(item);
  };

  return {
    draw(layout, { colours, allowances }) {
      pieces.removeChildren();
      const { levelsEnd } = layout;
      const { left, right } = layout.box;
      const levels = layout.levels.map(({ y }) =>
        straight({ x: 2 * left - right, y }, { x: Math.min(levelsEnd, 2 * right - left), y }),
      );
      layAll(pieces, levels, { colour: colours.level, width: 1 });
      for (const { piece, at } of layout.placed) {
        const outline = allowances ? piece.cutLine : piece.edges.flatMap((edge) => edge.path);
        const shape = pathOf(traced(outline, at, true));
        shape.fillColor = colours.paper;
        lay(pieces, shape, { colour: colours.ink, width: 1.4 });
        for (const edge of piece.edges) {
          const seam = pathOf(traced(edge.path, at, false));
          seam.data = { piece: piece.name, edge: edge.name };
          const dash = edge.open === true ? [1, 4] : [5, 3];
          lay(pieces, seam, { colour: colours.slate, width: 1, dash });
        }
      }
      const marks = marksOf(layout, allowances);
      for (const [pen, lines] of marks.strokes) layAll(pieces, lines, shown(pen, colours));
      arrowheads = { heads: marks.arrowheads, colour: colours.ink };
    },

    light(layout, lit, colours) {
      lights.removeChildren();
      const edgesOf = (refs: readonly EdgeRef[]): Line[] =>
        refs.flatMap((ref) => {
          const placed = layout.placed.find((each) => each.piece.name === ref.piece);
          const edge = placed?.piece.edges.find((each) => each.name === ref.edge);
          return placed === undefined || edge === undefined
            ? []
            : [traced(edge.path, placed.at, false)];
        });
      layAll(lights, edgesOf(lit.faults), { colour: colours.madder, width: 3 });
      layAll(lights, edgesOf(lit.seams), { colour: colours.verdigris, width: 3.5 });
      const lines = lit.lines.map(({ path, at }) => traced(path, at, false));
      layAll(lights, lines, { colour: colours.brass, width: 2 });
    },

    look(view) {
      layArrowheads(view.scale);
      scope.view.matrix.set(view.scale, 0, 0, view.scale, view.x, view.y);
      scope.view.update();
    },

    resize({ width, height }) {
      scope.view.viewSize = new scope.Size(width, height);
    },

    seamAt(at, reach) {
      const hits = scope.project.hitTestAll([at.x, at.y], {
        stroke: true,
        tolerance: reach,
        match: (hit) => edgeRef(hit.item.data) !== undefined,
      });
      return edgeRef(hits[0]?.item.data);
    },

    close() {
      scope.view.remove();
      scope.project.remove();
    },
  };
}

/** What a canvas line remembers of its edge; the level hairlines and marks remember nothing. */
function edgeRef(data: unknown): EdgeRef | undefined {
  if (typeof data !== 'object' || data === null || !('piece' in data) || !('edge' in data)) return;
  const { piece, edge } = data;
  return typeof piece === 'string' && typeof edge === 'string' ? { piece, edge } : undefined;
}
