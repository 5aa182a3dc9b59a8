import { onDartAxis, reachOnAxis } from '../../drafting/dart-axis.ts';
import { mouth } from '../../drafting/outline.ts';
import type { Dart, Piece } from '../../drafting/piece.ts';
import { endOf, startOf } from '../../geometry/curve.ts';
import { moved, turnAbout } from '../../geometry/motion.ts';
import { line } from '../../geometry/path.ts';
import { cross, dot, subtract } from '../../geometry/point.ts';

/** Names of the second dart and its mouth. */
const second = { dart: 'bust-2', mouth: 'bust-2-mouth' } as const;
export const secondBustDart = second.dart;

/**
 * A dart with straight legs divided into two beside each other about its tip: the first keeps `share` of its
 * angle and its name, the second lies nearer the side. No seam changes. The piece as it was where it has no such dart.
 */
export function divideDart(piece: Piece, name: string, share: number): Piece {
  const dart = piece.darts.find((each) => each.name === name);
  const open = piece.edges.find((edge) => edge.name === dart?.mouth);
  const pivot = dart && endOf(dart.centreLeg);
  const from = open && startOf(open.path);
  const until = open && endOf(open.path);
  if (!dart || !open || !pivot || !from || !until) return piece;
  const [a, b] = [subtract(from, pivot), subtract(until, pivot)];
  const angle = Math.atan2(cross(a, b), dot(a, b));
  const between = moved(from, turnAbout(pivot, angle * share));
  const first: Dart = { ...dart, sideLeg: [line(between, pivot)] };
  const other: Dart = {
    ...dart,
    name: second.dart,
    mouth: second.mouth,
    centreLeg: [line(between, pivot)],
  };
  return {
    ...piece,
    edges: piece.edges.flatMap((edge) =>
      edge === open
        ? [mouth(edge.name, from, between), mouth(second.mouth, between, until)]
        : [edge],
    ),
    darts: piece.darts.flatMap((each) => (each === dart ? [first, other] : [each])),
    drills: piece.drills.flatMap((drill) => {
      const reach = reachOnAxis(dart, drill);
      return reach === undefined ? [drill] : onDartAxis(first, reach);
    }),
  };
}
