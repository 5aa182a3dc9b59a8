import type { HouseRules } from '../drafting/house-rules.ts';
import type { Edge, Notch, NotchMark, Piece } from '../drafting/piece.ts';
import { crossingsOfLine, pointAt } from '../geometry/curve.ts';
import { type Path, type Segment, line } from '../geometry/path.ts';
import {
  type Point,
  add,
  cross,
  distance,
  dot,
  scale,
  subtract,
  turnRight,
} from '../geometry/point.ts';
import { allowanceOf } from './allowance.ts';

/** Distance between the two strokes of a back notch, mm (common practice, no source). */
const strokeGap = 6;

/** Longest stroke looked for: no allowance is wider, mm. */
const longest = 80;

/** A stroke on a fold, where no allowance stands, is drawn this far into the piece, mm. */
const onFold = 5;

/** Farther than this from the ends of its edge a notch meets the plain parallel of the edge, mm. */
const clearOfCorners = 40;

/** Whether a stretch may cross the endless line through a place: its handles lie on both sides. */
function mayCross(segment: Segment, from: Point, along: Point): boolean {
  const a = cross(along, subtract(segment.from, from));
  const b = cross(along, subtract(segment.to, from));
  if (a * b <= 0) return true;
  if (segment.kind === 'line') return false;
  const c = cross(along, subtract(segment.c1, from));
  const d = cross(along, subtract(segment.c2, from));
  return a * c <= 0 || a * d <= 0;
}

/** How far out from a place the cutting line lies; no answer where it is not met. */
function reachOut(cutLine: Path, from: Point, outward: Point): number | undefined {
  const beyond = add(from, outward);
  let nearest: number | undefined;
  for (const segment of cutLine) {
    if (!mayCross(segment, from, outward)) continue;
    for (const t of crossingsOfLine(segment, from, beyond)) {
      const reach = dot(subtract(pointAt(segment, t), from), outward);
      if (reach < -1e-6 || reach > longest) continue;
      if (nearest === undefined || reach < nearest) nearest = reach;
    }
  }
  return nearest;
}

/** The allowance a notch runs out through; no answer near a corner, where the cutting line turns. */
function plainReach(notch: Notch, edge: Edge | undefined, rules: HouseRules): number | undefined {
  const [start, end] = [edge?.path[0]?.from, edge?.path.at(-1)?.to];
  if (!edge || !start || !end || edge.kind === 'mouth') return undefined;
  const nearer = Math.min(distance(notch.at, start), distance(notch.at, end));
  return nearer > clearOfCorners ? allowanceOf(edge, rules) : undefined;
}

/**
 * The strokes of a notch, from the seam line square out to the cutting line: one on front pieces,
 * two 6 mm apart on back pieces. On a fold the stroke runs into the piece.
 */
export function notchMark(notch: Notch, piece: Piece, cutLine: Path, rules: HouseRules): NotchMark {
  const along = turnRight(notch.outward);
  const edge = piece.edges.find((each) => each.name === notch.edge);
  const plain = plainReach(notch, edge, rules);
  const offsets = notch.strokes === 1 ? [0] : [-strokeGap / 2, strokeGap / 2];
  const strokes = offsets.map((offset) => {
    const from = add(notch.at, scale(along, offset));
    const reach = plain ?? reachOut(cutLine, from, notch.outward) ?? 0;
    return line(from, add(from, scale(notch.outward, reach > 0.01 ? reach : -onFold)));
  });
  return { name: notch.name, edge: notch.edge, strokes };
}
