import { edge, notchAtLength, to } from '../../drafting/outline.ts';
import type { Edge, Piece } from '../../drafting/piece.ts';
import { pathLength } from '../../geometry/curve.ts';
import { type Path, line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { goreName } from './flare.ts';
import type { KneeStretch } from './knee-stretches.ts';
import type { SkirtPanel } from './skirt-panel.ts';

/** What a panel of the skirt has at and below the knee line. */
export type PanelFoot = {
  /** Its outer edge runs on by this, downwards; nothing where it ends at the knee line. */
  readonly outer: Path;
  /** Then, from the outer edge to the inner one: knee seam, or slits and hem. */
  readonly edges: readonly Edge[];
  /** Its inner edge begins with this, upwards to the knee line. */
  readonly inner: Path;
  /** Degrees at the start of the inner edge where they are meant not to be square. */
  readonly innerCorner?: number;
  readonly notches: Piece['notches'];
};

/** How each panel of the skirt ends, by the name of its piece. */
export type FootOf = (piece: string) => PanelFoot;

/** What an edge that begins below the knee line starts with. */
export const cornered = (inner: Edge, { innerCorner }: PanelFoot): Edge =>
  innerCorner === undefined ? inner : { ...inner, corner: innerCorner };

/** A panel that ends at the knee seam, in a stretch for each gore of the flare below it, marked half way along each. */
export function kneeFoot(panel: SkirtPanel, stretches: readonly KneeStretch[]): PanelFoot {
  const { piece, side, knee: y } = panel;
  const edges = stretches
    .filter(({ skirt }) => skirt === piece)
    .map(({ name, from, until, gore }) =>
      edge(name, 'seam', [line(point(until, y), point(from, y))], to(goreName(side, gore), name)),
    )
    .reverse();
  return {
    outer: [],
    edges,
    inner: [],
    notches: edges.flatMap((knee) =>
      notchAtLength(`${knee.name}-half`, knee, pathLength(knee.path) / 2, side === 'front' ? 1 : 2),
    ),
  };
}
