import type { Line, Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';
import type { EdgeKind } from './house-rules.ts';

export type Side = 'front' | 'back';

/** The levels of the body that hairlines and girths hang on, from the top down. */
export const levelNames = [
  'chest',
  'bust',
  'underbust',
  'waist-seam',
  'waist',
  'top-hip',
  'hip',
  'knee-seam',
  'hem',
] as const;
export type LevelName = (typeof levelNames)[number];

/** Names a partner edge: `{ piece: 'back-middle', edge: 'side' }`. */
export type EdgeRef = { readonly piece: string; readonly edge: string };

/**
 * One stretch of the finished outline. Edges follow each other round the piece, clockwise on the
 * page (y runs down), each starting where the one before ends; together they are the closed seam line.
 */
export type Edge = {
  /** Kebab-case trade word, unique in its piece: `side`, `waist-a`, `princess`, `top`, `centre`. */
  readonly name: string;
  readonly path: Path;
  readonly kind: EdgeKind;
  /** The edge it is sewn to; `self` where a pair of the same piece is joined (centre back). */
  readonly joins?: EdgeRef | 'self';
  /** Millimetres by which this edge is meant to be longer than its partner. */
  readonly ease?: number;
  readonly easeBetween?: readonly [string, string];
  /** Length of this edge over its partner's where it is gathered or pleated on. */
  readonly ratio?: number;
  /** Degrees of the corner at the start of this edge where it is meant not to be square. */
  readonly corner?: number;
  /** The mouth of a dart: part of the outline, closed by sewing the dart. */
  readonly open?: boolean;
  /** A hem turned up narrowly though it lies straight, because the hem beside it bends. */
  readonly narrow?: boolean;
};

/** What a dart takes out. Legs run from the mouth (or the upper tip) to the tip. */
export type Dart = {
  /** Kebab-case, unique in its piece: `waist`, `waist-2`, `top`. */
  readonly name: string;
  /** Where the tip lies from the mouth; `both` for a double-ended dart. */
  readonly tip: 'above' | 'below' | 'both';
  /** The leg nearer the centre line, and the leg nearer the side, each from mouth to tip. */
  readonly centreLeg: Path;
  readonly sideLeg: Path;
  /** Name of the open edge, absent for a double-ended dart. */
  readonly mouth?: string;
  /** Which way it is pressed, which shapes the cap. */
  readonly pressed: 'centre' | 'side' | 'down';
};

/** A level across a piece, from its centre edge to its side edge, both ends on the outline. */
export type LevelLine = { readonly level: LevelName; readonly from: Point; readonly to: Point };

/** A mark at a point of an edge. `outward` is the unit normal away from the piece. Single front, double back. */
export type Notch = {
  /** Same name on the two edges that meet: `hip`, `bust`, `waist`, `zip-end`. */
  readonly name: string;
  readonly edge: string;
  readonly at: Point;
  readonly outward: Point;
  readonly strokes: 1 | 2;
};

/** A line drawn inside a piece and neither cut nor sewn as a seam: where a bone lies, where a pleat folds. */
export type InnerLine = {
  /** Kebab-case, unique in its piece: `bone-princess`, `pleat-3-fold`. */
  readonly name: string;
  readonly kind: 'boning' | 'pleat-fold' | 'pleat-place' | 'stay' | 'stitching';
  readonly path: Path;
};

/** A piece as drafted: seam lines only. */
export type Piece = {
  /** Kebab-case: `front-top-centre`, `back-middle`, `flare-front`. */
  readonly name: string;
  /** As a maker reads it: `Front top, centre panel`. */
  readonly title: string;
  readonly side: Side;
  /** The part it belongs to. */
  readonly part: 'top' | 'middle' | 'flare' | 'sleeve' | 'inner';
  /** What it is cut from where that is not the gown's own cloth. */
  readonly cloth?: 'lining' | 'interfacing' | 'ribbon';
  /** As printed on the piece: `cut 1 on fold`, `cut 2 (a pair)`. */
  readonly cut: string;
  /** Cloth pieces to cut from this drawing. */
  readonly copies: number;
  readonly edges: readonly Edge[];
  readonly darts: readonly Dart[];
  readonly levels: readonly LevelLine[];
  readonly notches: readonly Notch[];
  readonly grain: { readonly from: Point; readonly to: Point };
  /** Drill points, 12 mm inside dart tips. */
  readonly drills: readonly Point[];
  readonly lines?: readonly InnerLine[];
};

/** One line of lettering; `at` is the left end of its base line, `size` its height in mm. */
export type Lettering = { readonly text: string; readonly at: Point; readonly size: number };

/** The strokes of a notch, each from the seam line out to the cutting line. */
export type NotchMark = {
  readonly name: string;
  readonly edge: string;
  readonly strokes: readonly Line[];
};

/** A piece with everything the scissors need. */
export type FinishedPiece = Piece & {
  /** Closed outline to cut, clockwise; runs along the fold where there is one. */
  readonly cutLine: Path;
  readonly notchMarks: readonly NotchMark[];
  readonly lettering: readonly Lettering[];
};
