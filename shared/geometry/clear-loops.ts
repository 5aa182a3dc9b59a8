import { Clipper, FillRule } from 'clipper2-ts';
import { flatten, pointAt } from './curve.ts';
import { type Path, type Segment, line } from './path.ts';
import { type Point, cross, subtract } from './point.ts';

type Box = {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly foot: number;
};

/** The box of a stretch's corners and handles, which holds the stretch. */
function hull(segment: Segment): Box {
  const { from: a, to: b } = segment;
  const c = segment.kind === 'line' ? a : segment.c1;
  const d = segment.kind === 'line' ? b : segment.c2;
  return {
    left: Math.min(a.x, b.x, c.x, d.x),
    right: Math.max(a.x, b.x, c.x, d.x),
    top: Math.min(a.y, b.y, c.y, d.y),
    foot: Math.max(a.y, b.y, c.y, d.y),
  };
}

const chords = (segment: Segment): readonly Point[] =>
  segment.kind === 'line'
    ? [segment.from, segment.to]
    : Array.from({ length: 9 }, (_, i) => pointAt(segment, i / 8));

function chordsCross(a: readonly Point[], b: readonly Point[]): boolean {
  for (let i = 1; i < a.length; i += 1) {
    const [p, q] = [a[i - 1], a[i]];
    for (let j = 1; j < b.length; j += 1) {
      const [r, s] = [b[j - 1], b[j]];
      if (!p || !q || !r || !s) continue;
      const along = subtract(q, p);
      const other = subtract(s, r);
      if (
        cross(along, subtract(r, p)) * cross(along, subtract(s, p)) < 0 &&
        cross(other, subtract(p, r)) * cross(other, subtract(q, r)) < 0
      ) {
        return true;
      }
    }
  }
  return false;
}

/** Whether stretches of a closed path cross, by chords of an eighth; neighbours only touch at their joint. */
export function crossesItself(path: Path): boolean {
  const boxes = path.map(hull);
  for (let i = 0; i < path.length; i += 1) {
    const [a, one] = [boxes[i], path[i]];
    for (let j = i + 1; j < path.length; j += 1) {
      const [b, other] = [boxes[j], path[j]];
      if (!a || !b || !one || !other) continue;
      if (a.left >= b.right || b.left >= a.right || a.top >= b.foot || b.top >= a.foot) continue;
      if (chordsCross(chords(one), chords(other))) return true;
    }
  }
  return false;
}

/**
 * A closed clockwise path without the loops it makes where it folds over itself: the outer outline,
 * in straight pieces within 0.01 mm. For the rare case; a path that lies simple is left alone.
 */
export function clearLoops(path: Path): Path {
  const flat = flatten(path, 0.01).map((p) => ({ x: p.x, y: p.y }));
  const outlines = Clipper.unionD([flat], [], FillRule.Positive, 4);
  let widest: readonly Point[] = [];
  let most = 0;
  for (const outline of outlines) {
    const area = Clipper.areaD(outline);
    if (area > most) [most, widest] = [area, outline];
  }
  return widest.map((from, index) => line(from, widest[(index + 1) % widest.length] ?? from));
}
