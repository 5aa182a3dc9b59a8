import { Clipper, FillRule } from 'clipper2-ts';
import { flatten } from './curve.ts';
import { type Path, line } from './path.ts';
import { type Point, point } from './point.ts';

/** An area of the paper by its rims: outer ones and those of holes run opposite ways. */
export type Region = readonly (readonly Point[])[];

/** Outlines are taken as chains this close to them, mm. */
const tolerance = 0.05;

/** How much of a closed outline another one covers, and what is left of each; areas in mm². */
export type Overlap = {
  /** Inside the first outline alone, and inside the second alone. */
  readonly first: Region;
  readonly second: Region;
  readonly firstArea: number;
  readonly secondArea: number;
};

/** Rims thinner than two pencil lines on their whole length are chords against chords, not a difference. */
const thinnest = 0.06;

const rimLength = (rim: readonly Point[]): number =>
  rim.reduce((sum, from, index) => {
    const to = rim[(index + 1) % rim.length] ?? from;
    return sum + Math.hypot(to.x - from.x, to.y - from.y);
  }, 0);

const plain = (chain: readonly Point[]) => chain.map(({ x, y }) => ({ x, y }));

function minus(a: readonly Point[], b: readonly Point[]): Region {
  return Clipper.differenceD([plain(a)], [plain(b)], FillRule.NonZero, 4)
    .map((rim) => rim.map(({ x, y }) => point(x, y)))
    .filter((rim) => Math.abs(areaOf([rim])) > (thinnest * rimLength(rim)) / 2);
}

/** Area of a region, mm²; holes are taken off. */
export const areaOf = (region: Region): number =>
  Math.abs(region.reduce((sum, rim) => sum + Clipper.areaD(plain(rim)), 0));

/** Area inside a closed path, mm². */
export const areaInside = (outline: Path): number => areaOf([flatten(outline, tolerance)]);

/** The outer rim round closed outlines that lie over each other, clockwise; several rims where they lie apart. */
export function outerRims(outlines: readonly Path[]): Path {
  const chains = outlines.map((each) => plain(flatten(each, tolerance)));
  return Clipper.unionD(chains, [], FillRule.NonZero, 4)
    .filter((rim) => Clipper.areaD(rim) > 0)
    .flatMap((rim) => rim.map((from, index) => line(from, rim[(index + 1) % rim.length] ?? from)));
}

/** What lies in one of two closed outlines and not in the other. */
export function overlapOf(first: Path, second: Path): Overlap {
  const [a, b] = [flatten(first, tolerance), flatten(second, tolerance)];
  const [onlyA, onlyB] = [minus(a, b), minus(b, a)];
  return { first: onlyA, second: onlyB, firstArea: areaOf(onlyA), secondArea: areaOf(onlyB) };
}

/**
 * Strokes that fill a region at a slant, `apart` mm from each other: rising to the right, or falling.
 * Strokes of neighbouring regions lie on the same lines.
 */
export function hatch(region: Region, way: 'rising' | 'falling', apart: number): Path {
  // Turned by 45 degrees the strokes lie level: u runs along them, v across.
  const sign = way === 'rising' ? 1 : -1;
  const across = ({ x, y }: Point): number => (y + sign * x) / Math.SQRT2;
  const along = ({ x, y }: Point): number => (x - sign * y) / Math.SQRT2;
  const back = (u: number, v: number): Point =>
    point((u + sign * v) / Math.SQRT2, (v - sign * u) / Math.SQRT2);
  const places = new Map<number, number[]>();
  for (const rim of region) {
    rim.forEach((from, index) => {
      const to = rim[(index + 1) % rim.length] ?? from;
      const [v0, v1] = [across(from), across(to)];
      const [low, high] = [Math.min(v0, v1), Math.max(v0, v1)];
      for (let row = Math.ceil(low / apart); row * apart < high; row += 1) {
        const share = (row * apart - v0) / (v1 - v0);
        const at = along(from) + share * (along(to) - along(from));
        places.set(row, [...(places.get(row) ?? []), at]);
      }
    });
  }
  return [...places].flatMap(([row, found]) => {
    const sorted = found.sort((a, b) => a - b);
    return sorted.flatMap((u, index) => {
      const until = sorted[index + 1];
      return index % 2 === 1 || until === undefined
        ? []
        : [line(back(u, row * apart), back(until, row * apart))];
    });
  });
}
