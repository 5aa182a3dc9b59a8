import { type DartPlace, moveDart } from '../../drafting/move-dart.ts';
import type { Piece } from '../../drafting/piece.ts';
import { seamInStretches, seamOf } from '../../drafting/seam-stretches.ts';
import { DraftingError } from '../../drafting/drafting-error.ts';
import { endTangent, pathLength, stationAtLength } from '../../geometry/curve.ts';
import type { Path } from '../../geometry/path.ts';
import { type Point, distance, dot } from '../../geometry/point.ts';
import { error } from '../../units/problem.ts';
import { mm, said } from '../../units/said.ts';
import { bustDart } from './pieces.ts';
import type { BustDartPlace } from './style-card.ts';

/** A side dart opens this far under the bust line, so that it points up to the bust (common practice, no source). */
const sideBelowBust = 40;
/** At most this part of the side seam down. */
const lowestOnSide = 0.6;
/** A neck dart opens this part of the way up from the centre front (common practice, no source). */
const neckShare = 0.25;

const lengthOf = (piece: Piece, name: string): number =>
  pathLength(piece.edges.find((edge) => edge.name === name)?.path ?? []);

/** Places along an edge that are tried for the one nearest to a point. */
const places = 64;

/** Length along an edge to its inner place nearest to a point: there a dart meets it squarely. */
function nearestOn(piece: Piece, name: string, to: Point): number {
  const path = piece.edges.find((edge) => edge.name === name)?.path ?? [];
  const whole = pathLength(path);
  const off = (length: number): number => {
    const station = stationAtLength(path, length);
    return station ? distance(station.at, to) : Infinity;
  };
  const lengths = Array.from({ length: places - 1 }, (_, k) => (whole * (k + 1)) / places);
  return lengths.reduce((best, each) => (off(each) < off(best) ? each : best), whole / 2);
}

/** What the places hang on: the bust notch along the side, the pivot, the allowance of the armhole. */
type DartFigures = {
  readonly bustNotch: number;
  readonly bustPoint: Point;
  readonly allowance: number;
};

/** Where on the front a place named on the style card lies. */
function placeOn(front: Piece, place: BustDartPlace, figures: DartFigures): DartPlace {
  if (place === 'armhole')
    return { edge: 'armhole', at: nearestOn(front, 'armhole', figures.bustPoint) };
  if (place === 'side') {
    const most = lowestOnSide * lengthOf(front, 'side');
    return { edge: 'side', at: Math.min(most, figures.bustNotch + sideBelowBust) };
  }
  if (place === 'neck') return { edge: 'neck', at: neckShare * lengthOf(front, 'neck') };
  if (front.darts.some((dart) => dart.name === 'waist')) return { dart: 'waist' };
  const waist = front.edges.find((edge) => edge.name === 'waist');
  const reach = (waist?.path[0]?.from.x ?? 0) - figures.bustPoint.x;
  return { edge: 'waist', at: Math.max(1, reach) };
}

/** Radius of the end of a path over a length before it, mm. */
function endRadius(path: Path, length: number): number {
  const whole = pathLength(path);
  const reach = Math.min(0.9 * whole, length);
  const before = stationAtLength(path, whole - reach)?.tangent ?? endTangent(path);
  const turned = Math.acos(Math.min(1, dot(before, endTangent(path))));
  return turned === 0 ? Infinity : reach / turned;
}

/** Share of that reach at which the two are sure to meet, an armhole being no true circle. */
const sureToMeet = 0.85;

/**
 * Refuses a dart too wide for a round armhole: folded, the armhole's cutting line would bend away from
 * the middle of the dart before it reached it, and no cap could be cut (two circles; derived, our rule).
 */
function refuseRoundArmhole(front: Piece, pivot: Point, allowance: number): void {
  const mouth = front.edges.find((edge) => edge.name === 'bust-mouth')?.path[0];
  const beside = front.edges.find((edge) => edge.name === 'armhole-a')?.path;
  if (!mouth || !beside) return;
  const width = distance(mouth.from, mouth.to);
  const leg = distance(mouth.from, pivot);
  const radius = endRadius(beside, width / 2);
  if (!Number.isFinite(radius)) return;
  if (((leg + radius) * width) / (2 * leg) <= sureToMeet * (radius - allowance)) return;
  throw new DraftingError([
    error({
      code: 'dart-too-wide-for-armhole',
      field: 'style.bustDart',
      with: ['style.bustDartRule'],
      said: said`In this armhole the bust dart would open by ${mm(width)}, too wide to be folded in so round an edge: sew it into the side seam or the shoulder, or choose another rule for it.`,
    }),
  ]);
}

/** The bust dart turned from the shoulder to the seam chosen. */
export function placeBustDart(front: Piece, place: BustDartPlace, figures: DartFigures): Piece {
  if (place === 'shoulder') return front;
  const moved = moveDart(front, bustDart, figures.bustPoint, placeOn(front, place, figures));
  if (!moved) throw new Error(`the bust dart finds no place in the ${place}`);
  if (place === 'armhole') refuseRoundArmhole(moved, figures.bustPoint, figures.allowance);
  return moved;
}

/** The back with its seams in as many stretches as the front's beside them. */
export function backToMatch(back: Piece, front: Piece): Piece {
  return ['shoulder', 'side'].reduce((piece, seam) => {
    const shares = front.edges
      .filter((edge) => edge.open !== true && seamOf(edge.name) === seam)
      .map((edge) => pathLength(edge.path));
    return shares.length < 2 ? piece : seamInStretches(piece, seam, shares);
  }, back);
}
