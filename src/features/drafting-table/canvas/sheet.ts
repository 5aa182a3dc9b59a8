import paper, { type Layer, type Pair, type SegmentParts } from 'paper/dist/paper-core.js';

import type { EdgeRef } from '#shared/drafting/piece.ts';
import type { Mark, Pen } from '#shared/exports/drawing.ts';
import { chainOf, pens } from '#shared/exports/marks.ts';
import { drawPiece } from '#shared/exports/piece-drawing.ts';
import type { Path } from '#shared/geometry/path.ts';
import { add, scale, subtract, type Point } from '#shared/geometry/point.ts';

import type { Colours } from './colours.ts';
import type { Layout } from './layout.ts';
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

type Line = { readonly segments: SegmentParts[]; readonly closed: boolean };

/** Lays a sheet on a canvas. Lines keep their width at every zoom. */
export function laySheet(canvas: HTMLCanvasElement): Sheet {
  const scope = new paper.PaperScope();
  scope.setup(canvas);
  scope.view.autoUpdate = false;
  const pieces = new scope.Layer();
  const lights = new scope.Layer();
  // Only now: a layer, unlike the items in it, has to be inserted into its project.
  scope.settings.insertItems = false;

  const stroke = (
    layer: Layer,
    lines: readonly Line[],
    style: { readonly colour: string; readonly width: number; readonly dash?: readonly number[] },
  ): void => {
    if (lines.length === 0) return;
    layer.addChild(
      new scope.CompoundPath({
        children: lines.map((each) => new scope.Path(each)),
        strokeColor: style.colour,
        strokeWidth: style.width,
        strokeScaling: false,
        strokeJoin: 'round',
        ...(style.dash === undefined ? {} : { dashArray: style.dash }),
      }),
    );
  };

  /** The trade's marks inside a piece; its outlines are drawn here, so that they can be pointed at. */
  const drawMark = (mark: Mark, at: Point, colours: Colours, allowances: boolean): void => {
    if (mark.kind === 'area') {
      const corners = enlarged(mark.corners);
      const path = chainOf([...corners, ...corners.slice(0, 1)]);
      pieces.addChild(new scope.Path({ ...traced(path, at, true), fillColor: colours.ink }));
    }
    if (mark.kind !== 'strokes' || mark.pen === pens.cut || mark.pen === pens.seam) return;
    // Notches start at the cutting line: without it they would stand beside the piece.
    if (!allowances && mark.pen === pens.notch) return;
    const lines = mark.paths.map((each) => traced(each, at, mark.closed === true));
    stroke(pieces, lines, {
      ...shown(mark.pen, colours),
      width: Math.max(0.8, mark.pen.width * 2.5),
    });
  };

  return {
    draw(layout, { colours, allowances }) {
      pieces.removeChildren();
      const width = layout.box.right - layout.box.left;
      const levels = layout.levels.map(({ y }) =>
        straight({ x: layout.box.left - width, y }, { x: layout.box.right + width, y }),
      );
      stroke(pieces, levels, { colour: colours.level, width: 1 });
      for (const { piece, at } of layout.placed) {
        const outline = allowances ? piece.cutLine : piece.edges.flatMap((edge) => edge.path);
        pieces.addChild(
          new scope.Path({
            ...traced(outline, at, true),
            fillColor: colours.paper,
            strokeColor: colours.ink,
            strokeWidth: 1.4,
            strokeScaling: false,
            strokeJoin: 'round',
          }),
        );
        for (const edge of piece.edges) {
          pieces.addChild(
            new scope.Path({
              ...traced(edge.path, at, false),
              strokeColor: colours.slate,
              strokeWidth: 1,
              strokeScaling: false,
              dashArray: edge.open === true ? [1, 4] : [5, 3],
              data: { piece: piece.name, edge: edge.name },
            }),
          );
        }
        for (const mark of drawPiece(piece).marks) drawMark(mark, at, colours, allowances);
      }
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
      stroke(lights, edgesOf(lit.faults), { colour: colours.madder, width: 3 });
      stroke(lights, edgesOf(lit.seams), { colour: colours.verdigris, width: 3.5 });
      const lines = lit.lines.map(({ path, at }) => traced(path, at, false));
      stroke(lights, lines, { colour: colours.brass, width: 2 });
    },

    look(view) {
      scope.view.matrix.set(view.scale, 0, 0, view.scale, view.x, view.y);
      scope.view.requestUpdate();
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

/** A path as paper wants it: places, each with its incoming and outgoing handle. */
function traced(path: Path, by: Point, closed: boolean): Line {
  const pair = (p: Point): Pair => [p.x + by.x, p.y + by.y];
  const handle = (from: Point, to: Point): Pair => [to.x - from.x, to.y - from.y];
  const none: Pair = [0, 0];
  const segments = path.map((each, index): SegmentParts => {
    const before = index > 0 ? path[index - 1] : closed ? path.at(-1) : undefined;
    const incoming = before?.kind === 'cubic' ? handle(each.from, before.c2) : none;
    return [pair(each.from), incoming, each.kind === 'cubic' ? handle(each.from, each.c1) : none];
  });
  const last = path.at(-1);
  if (!closed && last !== undefined) {
    segments.push([pair(last.to), last.kind === 'cubic' ? handle(last.to, last.c2) : none, none]);
  }
  return { segments, closed };
}

const straight = (from: Point, to: Point): Line => ({
  segments: [[[from.x, from.y]], [[to.x, to.y]]],
  closed: false,
});

/** An arrowhead grown about its tip: 5 mm is plain to see on paper and lost on a screen. */
function enlarged(corners: readonly Point[]): readonly Point[] {
  const tip = corners[0];
  if (tip === undefined) return corners;
  return corners.map((each) => add(tip, scale(subtract(each, tip), 2.4)));
}

/** A printing pen on screen: its greys become the page's colours, its dashes pixels. */
const shown = (pen: Pen, colours: Colours) => ({
  colour: pen.grey === undefined ? colours.ink : pen.grey === 1 ? colours.paper : colours.slate,
  ...(pen.dash === undefined ? {} : { dash: pen.dash }),
});
