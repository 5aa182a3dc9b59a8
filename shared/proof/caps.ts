import type { Dart, Edge, FinishedPiece } from '../drafting/piece.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import { startOf, startTangent } from '../geometry/curve.ts';
import {
  type Point,
  add,
  between,
  distance,
  dot,
  scale,
  subtract,
  unit,
} from '../geometry/point.ts';
import { type Clearance, allowanceOf, follows } from './clearance.ts';
import { boxedCut, reachCut } from './look-out.ts';
import { nearestPlace } from './nearest-place.ts';

/** Shares of the mouth at which the cap is folded down and measured. */
const shares = [0.05, 0.2, 0.35, 0.5, 0.65, 0.8, 0.95];

type Crease = { readonly at: Point; readonly along: Point };

const mirrored = (p: Point, { at, along }: Crease): Point => {
  const foot = add(at, scale(along, dot(subtract(p, at), along)));
  return subtract(scale(foot, 2), p);
};

/** The two legs at the mouth, the one the dart is laid over first, and the edge beneath it. */
function laidOver(
  piece: FinishedPiece,
  mouth: Edge,
  dart: Dart,
): { readonly near: Crease; readonly far: Crease; readonly beneath: Edge } | undefined {
  const index = piece.edges.indexOf(mouth);
  const before = piece.edges.at(index - 1);
  const after = piece.edges[(index + 1) % piece.edges.length];
  const centre = startOf(dart.centreLeg);
  const side = startOf(dart.sideLeg);
  const start = startOf(mouth.path);
  if (!before || !after || !centre || !side || !start) return undefined;
  const centreFirst = distance(centre, start) <= distance(side, start);
  const onCentre = dart.pressed === 'down' ? centre.y > side.y : dart.pressed === 'centre';
  const centreCrease = { at: centre, along: startTangent(dart.centreLeg) };
  const sideCrease = { at: side, along: startTangent(dart.sideLeg) };
  return {
    near: onCentre ? centreCrease : sideCrease,
    far: onCentre ? sideCrease : centreCrease,
    beneath: onCentre === centreFirst ? before : after,
  };
}

/**
 * For each dart mouth, the place where the cap, folded as it will be pressed, lies farthest from the
 * allowance of the edge beneath it.
 */
export function worstCaps(piece: FinishedPiece, rules: HouseRules): readonly Clearance[] {
  const cut = boxedCut(piece);
  return piece.darts.flatMap((dart) => {
    const mouth = piece.edges.find((edge) => edge.name === dart.mouth);
    const laid = mouth && laidOver(piece, mouth, dart);
    const wanted = laid && allowanceOf(laid.beneath, rules);
    if (!mouth || !laid || wanted === undefined) return [];
    const { near, far, beneath } = laid;
    const middle = { at: between(near.at, far.at, 0.5), along: unit(add(near.along, far.along)) };
    const out = scale(middle.along, -1);
    const reach = wanted + distance(near.at, far.at) + 20;
    let worst: Clearance | undefined;
    for (const share of shares) {
      const from = between(near.at, far.at, share);
      const away = reachCut(cut, from, out, reach);
      const on = away === undefined ? from : add(from, scale(out, away));
      const folded = mirrored(share > 0.5 ? mirrored(on, middle) : on, near);
      const off = nearestPlace(beneath.path, folded)?.off ?? 0;
      const found = away === undefined ? 0 : follows(beneath, wanted, folded) ? wanted : off;
      if (worst && Math.abs(found - wanted) <= Math.abs(worst.found - wanted)) continue;
      worst = { edge: mouth, wanted, found, at: from };
    }
    return worst ? [worst] : [];
  });
}
