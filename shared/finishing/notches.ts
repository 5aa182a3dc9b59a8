import type { Notch, NotchMark } from '../drafting/piece.ts';
import { crossingsOfLine, pointAt } from '../geometry/curve.ts';
import { type Path, type Segment, line } from '../geometry/path.ts';
import { type Point, add, cross, dot, scale, subtract, turnRight } from '../geometry/point.ts';

/** Distance between the two strokes of a back notch, mm (common practice, no source). */
const strokeGap = 6;

/** Longest stroke looked for: no allowance is wider, mm. */
const longest = 80;

/** A stroke on a fold, where no allowance stands, is drawn this far into the piece, mm. */
const onFold = 5;

/** Whether a stretch may cross the endless line through a place: its handles lie on both sides. */
function mayCross(segment: Segment, from: Point, along: Point): boolean {
  const side = (p: Point): number => cross(along, subtract(p, from));
  const ends = [side(segment.from), side(segment.to)];
  const all = segment.kind === 'line' ? ends : [...ends, side(segment.c1), side(segment.c2)];
  return Math.min(...all) <= 0 && Math.max(...all) >= 0;
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

/**
 * The strokes of a notch, from the seam line square out to the cutting line: one on front pieces,
 * two 6 mm apart on back pieces. On a fold the stroke runs into the piece.
 */
export function notchMark(notch: Notch, cutLine: Path): NotchMark {
  const along = turnRight(notch.outward);
  const offsets = notch.strokes === 1 ? [0] : [-strokeGap / 2, strokeGap / 2];
  const strokes = offsets.map((offset) => {
    const from = add(notch.at, scale(along, offset));
    const reach = reachOut(cutLine, from, notch.outward) ?? 0;
    return line(from, add(from, scale(notch.outward, reach > 0.01 ? reach : -onFold)));
  });
  return { name: notch.name, edge: notch.edge, strokes };
}
