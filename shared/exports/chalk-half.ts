import type { LevelName, Piece } from '../drafting/piece.ts';
import { type Path, cubic, line } from '../geometry/path.ts';
import { type Point, point } from '../geometry/point.ts';
import type { ChalkPoint } from './chalk-points.ts';
import type { Mark } from './drawing.ts';
import { outline, pens, stroke, strokes, words } from './marks.ts';

/** One quarter: four millimetres of body are one of paper. */
export const quarter = 0.25;

/** Height of the points' numbers, mm; they stand this far from their points. */
const numberSize = 2.3;
const numberOff = 2.4;

/** Where a place of the half-body frame stands on the page. */
export type OnPage = (at: Point) => Point;

type DrawnHalf = {
  readonly title: string;
  readonly pieces: readonly Piece[];
  readonly points: readonly ChalkPoint[];
  readonly onPage: OnPage;
};

/** A path with each of its points, handles too, put on the page. */
export const pathOnPage = (path: Path, onPage: OnPage): Path =>
  path.map((each) =>
    each.kind === 'line'
      ? line(onPage(each.from), onPage(each.to))
      : cubic(onPage(each.from), onPage(each.c1), onPage(each.c2), onPage(each.to)),
  );

/** Letters that stand for the levels, on the drawing and in the table. */
export const levelLetters: { readonly [L in LevelName]: string } = {
  chest: 'C',
  bust: 'B',
  underbust: 'U',
  'waist-seam': 'S',
  waist: 'W',
  'top-hip': 'T',
  hip: 'H',
  'knee-seam': 'K',
  hem: 'E',
};

/** A notch as strokes of this length out of the seam line, two of them so far apart, mm on the page. */
const notchLength = 2;
const notchApart = 0.9;

const notchesOf = ({ notches }: Piece, onPage: OnPage): readonly Path[] =>
  notches.flatMap(({ at, outward, strokes: count }) => {
    const { x, y } = onPage(at);
    const offsets = count === 1 ? [0] : [-notchApart / 2, notchApart / 2];
    return offsets.map((off) => {
      const [fromX, fromY] = [x - outward.y * off, y + outward.x * off];
      const [toX, toY] = [fromX + outward.x * notchLength, fromY + outward.y * notchLength];
      return stroke(fromX, fromY, toX, toY);
    });
  });

/** One half of the gown at quarter scale, its points dotted and numbered. */
export function drawHalf({ title, pieces, points, onPage }: DrawnHalf): readonly Mark[] {
  const small = (path: Path): Path => pathOnPage(path, onPage);
  const seams = pieces.map((each) => each.edges.flatMap((edge) => edge.path));
  const top = Math.min(...points.map((each) => each.at.y));
  const corner = onPage(point(0, top));
  return [
    ...seams.map((each) => outline({ width: 0.35 }, small(each))),
    strokes(
      pens.hairline,
      ...pieces.flatMap((each) =>
        each.darts.flatMap((dart) => [small(dart.centreLeg), small(dart.sideLeg)]),
      ),
    ),
    words(title, corner.x, corner.y - 4, 3.6, { heavy: true }),
    strokes(
      { width: 0.9 },
      ...points.map((each) => {
        const { x, y } = onPage(each.at);
        return stroke(x - 0.45, y, x + 0.45, y);
      }),
    ),
    strokes(pens.notch, ...pieces.flatMap((each) => notchesOf(each, onPage))),
    ...points.map(({ number, at, aside }) => {
      const { x, y } = onPage(at);
      return words(
        String(number),
        x + aside.x * numberOff,
        y + aside.y * numberOff + numberSize * 0.33,
        numberSize,
        { anchor: 'middle' },
      );
    }),
  ];
}
