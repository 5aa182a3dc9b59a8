import type { WantedGirth } from '../drafting/construction.ts';
import type { LevelLine, LevelName, Piece } from '../drafting/piece.ts';
import { endOf, pathCrossings, pathLength, startOf } from '../geometry/curve.ts';
import { type Point, distance } from '../geometry/point.ts';
import { finding, missing, proofLine } from './finding.ts';
import type { Finding, GirthRow, ProofLine } from './proof.ts';

const bound = 0.5;
/** An end of a level this far from the outline, or from the tip of a dart, marks no width. */
const onOutline = 0.05;

const titles: { readonly [L in LevelName]?: string } = {
  bust: 'Bust',
  waist: 'Waist',
  hip: 'Hip',
  hem: 'Hem',
};

/** Places where a level meets the sewn outline, or the tip of a dart it bends at. */
const anchors = (piece: Piece, { from, to }: LevelLine): readonly Point[] => [
  ...piece.edges
    .filter((edge) => edge.open !== true)
    .flatMap((edge) => pathCrossings(edge.path, from, to).map((station) => station.at)),
  ...piece.edges.flatMap((edge) => [startOf(edge.path) ?? from, endOf(edge.path) ?? to]),
  ...piece.darts.flatMap((dart) => endOf(dart.centreLeg) ?? []),
];

/** Width of a dart where a level crosses it. */
function intakeAt(piece: Piece, { from, to }: LevelLine): number {
  return piece.darts.reduce((sum, dart) => {
    const [a] = pathCrossings(dart.centreLeg, from, to);
    const [b] = pathCrossings(dart.sideLeg, from, to);
    const inside = (at: Point): boolean =>
      distance(from, at) + distance(at, to) - distance(from, to) < onOutline;
    return a && b && inside(a.at) && inside(b.at) ? sum + distance(a.at, b.at) : sum;
  }, 0);
}

/** Width of a piece along a level, in as many stretches as it bends into, darts closed; mm. */
function widthAlong(piece: Piece, level: LevelName): number | undefined {
  const stretches = piece.levels.filter((each) => each.level === level);
  let width = 0;
  for (const stretch of stretches) {
    const places = anchors(piece, stretch);
    const near = (end: Point): Point | undefined =>
      places.find((place) => distance(place, end) < onOutline);
    const from = near(stretch.from);
    const to = near(stretch.to);
    if (!from || !to) return undefined;
    width += distance(from, to) - intakeAt(piece, stretch);
  }
  return stretches.length === 0 ? undefined : width;
}

/** Length of the waist seam of a piece, darts closed; mm. */
function waistOf(piece: Piece): number | undefined {
  const edges = piece.edges.filter(
    (edge) => edge.open !== true && /^waist(-[a-z])?$/.test(edge.name),
  );
  if (edges.length === 0) return undefined;
  return edges.reduce((sum, edge) => sum + pathLength(edge.path), 0);
}

function girthFinding(pieces: readonly Piece[], wanted: WantedGirth): Finding {
  const widths = pieces.map((piece) =>
    wanted.level === 'waist' ? waistOf(piece) : widthAlong(piece, wanted.level),
  );
  const title = titles[wanted.level] ?? wanted.level;
  const where = pieces.map(({ name }) => ({ piece: name }));
  if (widths.length === 0 || widths.includes(undefined)) {
    return missing([`${title}: not found on every piece.`], where);
  }
  const girth = 2 * widths.reduce<number>((sum, width) => sum + (width ?? 0), 0);
  return finding(
    girth,
    wanted.wanted,
    bound,
    [
      ...(wanted.body === undefined
        ? [`${title}: asked `, { mm: wanted.wanted }]
        : [
            `${title}: body `,
            { mm: wanted.body },
            ' with ease ',
            { mm: wanted.ease ?? 0 },
            ' makes ',
            { mm: wanted.wanted },
          ]),
      '; the pieces measure ',
      { mm: girth },
      '.',
    ],
    where,
  );
}

/**
 * Proof line 1 of a block: at each level twice the widths of front and back, darts closed, are body and
 * ease. The waist is counted along its seam; a level that bends where a dart was moved, along both stretches.
 */
export function proveBlockGirths(
  pieces: readonly Piece[],
  wanted: readonly WantedGirth[],
): { readonly line: ProofLine; readonly rows: readonly GirthRow[] } {
  const findings = wanted.map((each) => girthFinding(pieces, each));
  return {
    line: proofLine(1, 'Girths come out as body and ease', findings),
    rows: wanted.map((each, k) => ({ ...each, pieces: findings[k]?.value ?? 0 })),
  };
}
