import type { LevelName, Piece } from '../drafting/piece.ts';
import { movedPath, shift } from '../geometry/motion.ts';
import type { Path } from '../geometry/path.ts';
import type { ChalkPoint } from './chalk-points.ts';
import type { Mark } from './drawing.ts';
import { outline, pens, stroke, strokes, words } from './marks.ts';
import { shrink } from './page-plan.ts';

/** One quarter: four millimetres of body are one of paper. */
export const quarter = 0.25;

/** Height of the points' numbers, mm; they stand this far from their points. */
const numberSize = 2.3;
const numberOff = 2.4;

type DrawnHalf = {
  readonly title: string;
  readonly pieces: readonly Piece[];
  readonly points: readonly ChalkPoint[];
  /** Where the centre line stands on the page. */
  readonly x: number;
};

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

/** One half of the gown, with the body's height 0 at `y` on the page. */
export function drawHalf({ title, pieces, points, x }: DrawnHalf, y: number): readonly Mark[] {
  const small = (path: Path): Path => shrink(path, quarter, { x, y });
  const seams = pieces.map((each) => each.edges.flatMap((edge) => edge.path));
  const top = Math.min(...points.map((each) => each.at.y));
  return [
    ...seams.map((each) => outline({ width: 0.35 }, small(each))),
    strokes(
      pens.hairline,
      ...pieces.flatMap((each) =>
        each.darts.flatMap((dart) => [small(dart.centreLeg), small(dart.sideLeg)]),
      ),
    ),
    words(title, x, y + top * quarter - 4, 3.6, { heavy: true }),
    strokes(
      { width: 0.9 },
      ...points.map(({ at }) =>
        movedPath(stroke(-0.45, 0, 0.45, 0), shift(x + at.x * quarter, y + at.y * quarter)),
      ),
    ),
    ...points.map(({ number, at, aside }) =>
      words(
        String(number),
        x + at.x * quarter + aside.x * numberOff,
        y + at.y * quarter + aside.y * numberOff + numberSize * 0.33,
        numberSize,
        { anchor: 'middle' },
      ),
    ),
  ];
}
