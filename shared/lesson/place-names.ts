import type { NamedPoint } from './step-picture.ts';
import type { Point } from '../geometry/point.ts';

/** A name on a drawing, in the drawing's own unit: pixels of a screen, mm of a page. */
export type PlacedName = {
  readonly name: string;
  readonly at: Point;
  readonly x: number;
  readonly y: number;
  readonly anchor: 'start' | 'end';
  readonly now: boolean;
};

type Room = { readonly width: number; readonly height: number; readonly letters: number };

/** About how wide a letter is, as a part of its size. */
const letterWidth = 0.54;
/** A name stands this far beside its point, as a part of the letters. */
const beside = 0.6;

/**
 * Names beside their points so that none covers another, those on the centre line outside of it: this
 * step's first, then earlier levels as far as there is room. Points outside the drawing have none.
 */
export function placeNames(
  points: readonly NamedPoint[],
  toScreen: (at: Point) => Point,
  { width, height, letters }: Room,
): readonly PlacedName[] {
  const placed: PlacedName[] = [];
  const order = [
    ...points.filter(({ now }) => now),
    ...points.filter(({ now, at }) => !now && at.x === 0).reverse(),
  ];
  for (const { name, at, now } of order) {
    const dot = toScreen(at);
    if (dot.x < -1 || dot.y < -1 || dot.x > width + 1 || dot.y > height + 1) continue;
    if (placed.some((each) => each.name === name)) continue;
    const long = name.length * letters * letterWidth;
    const off = letters * beside;
    const onCentre = at.x === 0 && dot.x - off - long > 0;
    const anchor = onCentre || dot.x + off + long > width ? 'end' : 'start';
    const x = anchor === 'start' ? dot.x + off : dot.x - off;
    const tries = [-0.45, 1.15, -1.5, 2.2].map((lines) =>
      Math.min(height - letters * 0.3, Math.max(letters, dot.y + lines * letters)),
    );
    const left = anchor === 'start' ? x : x - long;
    const free = tries.find((y) =>
      placed.every((other) => {
        const otherLong = other.name.length * letters * letterWidth;
        const otherLeft = other.anchor === 'start' ? other.x : other.x - otherLong;
        const apart =
          left > otherLeft + otherLong + letters * 0.4 || otherLeft > left + long + letters * 0.4;
        return apart || Math.abs(other.y - y) >= letters * 1.05;
      }),
    );
    if (free === undefined && !now) continue;
    placed.push({ name, at: dot, x, y: free ?? tries[0] ?? dot.y, anchor, now });
  }
  return placed;
}
