import type { Dart, Edge } from '../drafting/piece.ts';
import { pathCrossings, reverse, splitPath, startOf, startTangent } from '../geometry/curve.ts';
import { type Run, endAtLine, startAtLine } from '../geometry/corner.ts';
import type { Path } from '../geometry/path.ts';
import { line } from '../geometry/path.ts';
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

/** An endless line: a place on it and its direction, length one. */
type Crease = { readonly at: Point; readonly along: Point };

/** The cutting line round the mouth of a dart, with the cutting lines beside it cut to meet it. */
export type DartCap = { readonly before: Path; readonly cap: Path; readonly after: Path };

function mirrored(p: Point, crease: Crease): Point {
  const out = subtract(p, crease.at);
  const foot = add(crease.at, scale(crease.along, dot(out, crease.along)));
  return subtract(scale(foot, 2), p);
}

/** A path as it shows through when the paper is folded along a crease. */
function mirroredPath(path: Path, crease: Crease): Path {
  return path.map((each) => {
    const from = mirrored(each.from, crease);
    const to = mirrored(each.to, crease);
    return each.kind === 'line'
      ? { kind: 'line', from, to }
      : { kind: 'cubic', from, c1: mirrored(each.c1, crease), c2: mirrored(each.c2, crease), to };
  });
}

/** The first part of a path, up to where it meets the middle of the dart, run on straight if short. */
function toMiddle(path: Path, middle: Crease): Path {
  const met = pathCrossings(path, middle.at, add(middle.at, middle.along))[0];
  if (met) return splitPath(path, met)[0];
  const last = path.at(-1);
  if (!last) return path;
  const along = unit(subtract(last.to, last.kind === 'line' ? last.from : last.c2));
  const slope = along.x * middle.along.y - along.y * middle.along.x;
  const out = subtract(middle.at, last.to);
  const reach = (out.x * middle.along.y - out.y * middle.along.x) / slope;
  return [...path, line(last.to, add(last.to, scale(along, reach)))];
}

/** Whether the closed dart is laid over the edge before its mouth (clockwise), or over the one after. */
function laidBefore(dart: Dart, legBefore: Path, legAfter: Path): boolean {
  if (dart.pressed === 'down') {
    return (startOf(legBefore)?.y ?? 0) >= (startOf(legAfter)?.y ?? 0);
  }
  return (dart.pressed === 'centre') === (legBefore === dart.centreLeg);
}

/**
 * The cap of a dart as a cutter gets it: the dart is folded along its legs, laid the way it will be
 * pressed, and cut along the cutting line beneath; opened out, that line stands mirrored about the
 * leg as far as the dart's middle, and mirrored back about the middle as far as the other leg.
 * `undefined` where a neighbouring cutting line does not reach the legs.
 */
export function dartCap(mouth: Edge, dart: Dart, before: Run, after: Run): DartCap | undefined {
  const start = startOf(mouth.path);
  const end = mouth.path.at(-1)?.to;
  const centre = startOf(dart.centreLeg);
  if (!start || !end || !centre) return undefined;
  const [legBefore, legAfter] =
    distance(centre, start) < distance(centre, end)
      ? [dart.centreLeg, dart.sideLeg]
      : [dart.sideLeg, dart.centreLeg];
  const first: Crease = { at: start, along: startTangent(legBefore) };
  const second: Crease = { at: end, along: startTangent(legAfter) };
  const middle: Crease = {
    at: between(start, end, 0.5),
    along: unit(add(first.along, second.along)),
  };
  const cutBefore = endAtLine(before, start, first.at, first.along);
  const cutAfter = startAtLine(after, end, second.at, second.along);
  if (!cutBefore || !cutAfter) return undefined;
  if (laidBefore(dart, legBefore, legAfter)) {
    const near = toMiddle(mirroredPath(reverse(cutBefore), first), middle);
    return {
      before: cutBefore,
      cap: [...near, ...reverse(mirroredPath(near, middle))],
      after: cutAfter,
    };
  }
  const near = toMiddle(mirroredPath(cutAfter, second), middle);
  return {
    before: cutBefore,
    cap: [...mirroredPath(near, middle), ...reverse(near)],
    after: cutAfter,
  };
}
