import { type DartPlace, moveDart } from '../../drafting/move-dart.ts';
import type { Piece } from '../../drafting/piece.ts';
import { seamInStretches, seamOf } from '../../drafting/seam-stretches.ts';
import { DraftingError } from '../../drafting/drafting-error.ts';
import { endTangent, pathLength, stationAtLength } from '../../geometry/curve.ts';
import type { Path } from '../../geometry/path.ts';
import { type Point, distance, dot } from '../../geometry/point.ts';
import { error } from '../../units/problem.ts';
import { mm, said } from '../../units/said.ts';
import { divideDart, secondBustDart } from './divide-dart.ts';
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

/** Places along an edge that are tried for the one nearest to a point, and how often it is drawn closer. */
const places = 64;
const refinements = 24;

/** Length along an edge to its inner place nearest to a point: there a dart meets it squarely. */
function nearestOn(piece: Piece, name: string, to: Point): number {
  const path = piece.edges.find((edge) => edge.name === name)?.path ?? [];
  const whole = pathLength(path);
  const off = (length: number): number => {
    const station = stationAtLength(path, length);
    return station ? distance(station.at, to) : Infinity;
  };
  const lengths = Array.from({ length: places - 1 }, (_, k) => (whole * (k + 1)) / places);
  const near = lengths.reduce((best, each) => (off(each) < off(best) ? each : best), whole / 2);
  let [low, high] = [near - whole / places, near + whole / places];
  for (let i = 0; i < refinements; i += 1) {
    const [a, b] = [low + (high - low) / 3, high - (high - low) / 3];
    if (off(a) < off(b)) high = b;
    else low = a;
  }
  return (low + high) / 2;
}

/** What the places hang on: the bust notch along the side, the pivot, the allowance of the armhole. */
type DartFigures = {
  readonly bustNotch: number;
  readonly bustPoint: Point;
  readonly allowance: number;
};

const sideDepth = (front: Piece, { bustNotch }: DartFigures): number =>
  Math.min(lowestOnSide * lengthOf(front, 'side'), bustNotch + sideBelowBust);

/** The waist dart that ends at the bust point, or the place of the waist under it. */
function waistPlace(front: Piece, bustPoint: Point): DartPlace {
  if (front.darts.some((dart) => dart.name === 'waist')) return { dart: 'waist' };
  const waist = front.edges.find((edge) => edge.name === 'waist');
  const reach = (waist?.path[0]?.from.x ?? 0) - bustPoint.x;
  return { edge: 'waist', at: Math.max(1, reach) };
}

/** An upright dart keeps this far from the ends of the shoulder (our rule). */
const besideUpright = 15;

/** The place of the shoulder straight above the bust point, or the nearest that leaves cloth to fold the dart on. */
function abovePlace(front: Piece, bustPoint: Point): DartPlace {
  const inner = front.edges.find((edge) => edge.name === 'shoulder-a')?.path[0];
  if (!inner) return { edge: 'shoulder-b', at: 1 };
  const whole = pathLength([inner]);
  const outer = lengthOf(front, 'shoulder-b');
  const across = (inner.to.x - inner.from.x) / whole;
  const at = Math.min(
    whole + outer - besideUpright,
    Math.max(besideUpright, (bustPoint.x - inner.from.x) / across),
  );
  return at < whole ? { edge: 'shoulder-a', at } : { edge: 'shoulder-b', at: at - whole };
}

/** Where on the front a place named on the style card lies. */
function placeOn(
  front: Piece,
  place: Exclude<BustDartPlace, 'shoulder' | 'armhole'>,
  figures: DartFigures,
): DartPlace {
  switch (place) {
    case 'side':
      return { edge: 'side', at: sideDepth(front, figures) };
    case 'neck':
      return { edge: 'neck', at: neckShare * lengthOf(front, 'neck') };
    case 'topLine':
      return abovePlace(front, figures.bustPoint);
    case 'waist':
      return waistPlace(front, figures.bustPoint);
  }
}

/** Radius of an end of a path over a length beside it, mm. */
function endRadius(path: Path, length: number): number {
  const whole = pathLength(path);
  const reach = Math.min(0.9 * whole, length);
  const before = stationAtLength(path, whole - reach)?.tangent ?? endTangent(path);
  const turn = Math.acos(Math.min(1, dot(before, endTangent(path))));
  return turn === 0 ? Infinity : reach / turn;
}

/** Share of that reach at which the two are sure to meet, an armhole being no true circle. */
const sureToMeet = 0.85;

/** The cutting line beside the dart turns with at least this radius, mm: a tighter one is no line to fold on (our rule). */
const roomToTurn = 5;

/**
 * Whether a dart can be folded in a round armhole: where it is too wide, the cutting line of the armhole beside
 * it bends away from the middle of the dart before it reaches it, and no cap can be cut (two circles;
 * derived, our rule).
 */
function foldsInArmhole(front: Piece, pivot: Point, allowance: number): boolean {
  const open = front.edges.find((edge) => edge.name === 'bust-mouth')?.path[0];
  const beside = front.edges.find((edge) => edge.name === 'armhole-a')?.path;
  if (!open || !beside) return true;
  const width = distance(open.from, open.to);
  const leg = distance(open.from, pivot);
  const radius = endRadius(beside, width / 2);
  const meets = ((leg + radius) * width) / (2 * leg) <= sureToMeet * (radius - allowance);
  return !Number.isFinite(radius) || (meets && radius >= allowance + roomToTurn);
}

/** A front whose bust dart is sewn where the style card says, and the part of its angle that went there. */
export type PlacedDart = { readonly front: Piece; readonly share: number };

function turned(piece: Piece, name: string, { bustPoint }: DartFigures, to: DartPlace): Piece {
  const turnedPiece = moveDart(piece, name, bustPoint, to);
  if (!turnedPiece) throw new Error(`the dart ${name} finds no place in ${JSON.stringify(to)}`);
  return turnedPiece;
}

/** The dart in the armhole with this part of its angle; the rest goes to the waist. */
function inArmhole(front: Piece, share: number, figures: DartFigures): Piece {
  const { bustPoint } = figures;
  const rested =
    share === 1
      ? front
      : turned(
          divideDart(front, bustDart, share),
          secondBustDart,
          figures,
          waistPlace(front, bustPoint),
        );
  const at = nearestOn(rested, 'armhole', bustPoint);
  return turned(rested, bustDart, figures, { edge: 'armhole', at });
}

/** A narrower dart in the armhole is not worth sewing, mm (our rule). */
const leastInArmhole = 12;

/**
 * As much of the dart as a round armhole can fold, the rest in the waist (common practice, no source: a wide
 * bust dart is divided between two seams).
 */
function armholeDart(front: Piece, figures: DartFigures): PlacedDart {
  const fits = (piece: Piece): boolean =>
    foldsInArmhole(piece, figures.bustPoint, figures.allowance);
  const whole = inArmhole(front, 1, figures);
  if (fits(whole)) return { front: whole, share: 1 };
  let low = Math.min(1, leastInArmhole / lengthOf(whole, 'bust-mouth'));
  let high = 1;
  let best = inArmhole(front, low, figures);
  if (!fits(best)) {
    throw new DraftingError([
      error({
        code: 'dart-too-wide-for-armhole',
        field: 'style.bustDart',
        with: ['style.bustDartRule', 'style.armholeDrop'],
        said: said`So round an armhole, ${mm(lengthOf(front, 'armhole'))} long in front, folds no part of the bust dart that is worth sewing: sew it into the side seam or the shoulder, or lower the armhole.`,
      }),
    ]);
  }
  for (let i = 0; i < 7; i += 1) {
    const share = (low + high) / 2;
    const tried = inArmhole(front, share, figures);
    if (fits(tried)) [low, best] = [share, tried];
    else high = share;
  }
  return { front: best, share: low };
}

/** The bust dart turned from the shoulder to the seam chosen. */
export function placeBustDart(
  front: Piece,
  place: BustDartPlace,
  figures: DartFigures,
): PlacedDart {
  if (place === 'shoulder') return { front, share: 1 };
  if (place === 'armhole') return armholeDart(front, figures);
  return { front: turned(front, bustDart, figures, placeOn(front, place, figures)), share: 1 };
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
