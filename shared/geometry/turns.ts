import { pointAt, tangentAt } from './curve.ts';
import type { Cubic, Path, Segment } from './path.ts';
import { type Point, cross, distance, dot, subtract } from './point.ts';

/** A run of a path that bends one way: degrees it turns (to the right is positive), and where it ends. */
export type Turn = { readonly degrees: number; readonly until: Point };

const degreesBetween = (from: Point, to: Point): number =>
  (Math.atan2(cross(from, to), dot(from, to)) * 180) / Math.PI;

/** Shares between 0 and 1 at which a cubic stops bending one way: roots of cross(B', B''), a quadratic. */
function inflections({ from, c1, c2, to }: Cubic): readonly number[] {
  const a = subtract(c1, from);
  const b = subtract(subtract(c2, c1), a);
  const c = subtract(subtract(subtract(to, c2), a), { x: 2 * b.x, y: 2 * b.y });
  const [p, q, r] = [cross(b, c), cross(a, c), cross(a, b)];
  const size = Math.max(Math.abs(p), Math.abs(q), Math.abs(r));
  const under = q * q - 4 * p * r;
  if (size === 0 || under < 0) return [];
  if (Math.abs(p) < 1e-12 * size) return q === 0 ? [] : inside([-r / q]);
  const root = -0.5 * (q + Math.sign(q || 1) * Math.sqrt(under));
  return inside(root === 0 ? [0] : [root / p, r / root]);
}

const inside = (shares: readonly number[]): readonly number[] =>
  shares.filter((t) => t > 1e-6 && t < 1 - 1e-6).toSorted((a, b) => a - b);

function turnsOf(segment: Segment): readonly Turn[] {
  if (segment.kind === 'line') return [{ degrees: 0, until: segment.to }];
  const shares = [0, ...inflections(segment), 1];
  return shares.slice(1).flatMap((until, k): Turn[] => {
    const from = shares[k] ?? 0;
    // Halved, so that a stretch turning by nearly half a circle is not read the other way round.
    const middle = tangentAt(segment, (from + until) / 2);
    const degrees =
      degreesBetween(tangentAt(segment, from), middle) +
      degreesBetween(middle, tangentAt(segment, until));
    return [{ degrees, until: pointAt(segment, until) }];
  });
}

/** How a path bends along its way, stretch by stretch and at the joints between them; degrees. */
export const turnsAlong = (path: Path): readonly Turn[] =>
  path.flatMap((segment, k) => {
    const before = path[k - 1];
    const joint = before ? degreesBetween(tangentAt(before, 1), tangentAt(segment, 0)) : 0;
    return [{ degrees: joint, until: segment.from }, ...turnsOf(segment)];
  });

/** A run of bends to one side: how far it turns, where it begins and ends, its sharpest joint, degrees. */
type Bend = {
  readonly degrees: number;
  readonly from: Point;
  readonly until: Point;
  readonly sharpest: number;
};

/** Less than this is no turn but a rounding, degrees. */
const nothing = 1e-6;

/** What shows of a bend, mm: an arc swings off its chord by an eighth of its length times its angle. */
const depthOf = ({ degrees, from, until }: Bend): number =>
  (distance(from, until) * Math.abs(degrees) * Math.PI) / 180 / 8;

const joined = (...bends: readonly [Bend, ...Bend[]]): Bend => ({
  degrees: bends.reduce((sum, { degrees }) => sum + degrees, 0),
  from: bends[0].from,
  until: bends.at(-1)?.until ?? bends[0].until,
  sharpest: Math.max(...bends.map(({ sharpest }) => sharpest)),
});

/** Turns one after the other as bends, each to the other side of the one before. */
function bendsOf(turns: readonly Turn[]): readonly Bend[] {
  const bends: Bend[] = [];
  let from: Point | undefined;
  for (const { degrees, until } of turns) {
    const start = from ?? until;
    from = until;
    if (Math.abs(degrees) < nothing) continue;
    const sharpest = distance(start, until) === 0 ? Math.abs(degrees) : 0;
    const next = { degrees, from: start, until, sharpest };
    const last = bends.at(-1);
    if (last && last.degrees * degrees > 0) bends[bends.length - 1] = joined(last, next);
    else bends.push(next);
  }
  return bends;
}

/**
 * The places at which the bends of a path change from one way to the other. A bend that swings less than
 * `least` mm off its chord is not seen, unless it has a joint that turns by `kink` degrees or more: it
 * belongs to the bends beside it, the slightest first.
 */
export function bendChanges(
  turns: readonly Turn[],
  { least, kink }: { readonly least: number; readonly kink: number },
): readonly Point[] {
  let bends = bendsOf(turns);
  const weight = (bend: Bend): number => (bend.sharpest >= kink ? Infinity : depthOf(bend));
  for (;;) {
    const slightest = Math.min(...bends.map(weight));
    if (bends.length === 0 || slightest >= least) break;
    const k = bends.findIndex((bend) => weight(bend) === slightest);
    const [before, here, after] = [bends[k - 1], bends[k], bends[k + 1]];
    bends =
      before && here && after
        ? [...bends.slice(0, k - 1), joined(before, here, after), ...bends.slice(k + 2)]
        : bends.toSpliced(k, 1);
  }
  return bends.slice(1).map(({ from }) => from);
}
