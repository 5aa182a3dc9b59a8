import type { Path } from '../geometry/path.ts';
import { type Point, add, point } from '../geometry/point.ts';
import { type NamedPoint, type StepPicture, stepPicture } from '../lesson/step-picture.ts';
import { placeNames } from '../lesson/place-names.ts';
import type { Told } from '../lesson/told.ts';
import type { Box } from '../sheets/layout.ts';
import { pathOnPage } from './chalk-half.ts';
import type { Mark, Pen } from './drawing.ts';
import { area, box, outline, pens, stroke, strokes, words } from './marks.ts';
import { spread } from './spread.ts';
import { typeWidth } from './type-width.ts';

/** What was there before this step, and what is new in it, mm. */
const before: Pen = { width: 0.13, grey: 0.4 };
const now: Pen = { width: 0.6 };
const cut: Pen = { width: 0.3 };
const centre: Pen = { width: 0.13, grey: 0.4, dash: [3, 1, 0.6, 1] };

/** Height of a point's name, and half the size of its dot. */
const letters = 2.3;
const dotSize = { now: 0.75, before: 0.35 } as const;
const rim = 2;

type Frame = Box;

/** Puts a look of the paper into a frame of the page, as large as it fits. */
function pageOf(
  look: Box,
  frame: Frame,
): { readonly scale: number; readonly at: (p: Point) => Point } {
  const width = frame.width - 2 * rim;
  const height = frame.height - 2 * rim;
  const scale = Math.min(width / look.width, height / look.height);
  const left = frame.x + (frame.width - look.width * scale) / 2 - look.x * scale;
  const top = frame.y + (frame.height - look.height * scale) / 2 - look.y * scale;
  return { scale, at: ({ x, y }) => point(left + x * scale, top + y * scale) };
}

const dot = ({ x, y }: Point, size: number): Mark =>
  area(0, point(x - size, y), point(x, y - size), point(x + size, y), point(x, y + size));

type Names = { readonly grounds: readonly Mark[]; readonly words: readonly Mark[] };

/** Names of points, and the white they stand on, so that no thin line strikes them through. */
function namesOf(points: readonly NamedPoint[], at: (p: Point) => Point, frame: Frame): Names {
  const inFrame = (p: Point): Point => {
    const onPage = at(p);
    return point(onPage.x - frame.x, onPage.y - frame.y);
  };
  const set = placeNames(points, inFrame, { ...frame, letters }).map(
    ({ name, x, y, anchor, now: lit }) => {
      const size = lit ? letters : letters * 0.88;
      const wide = typeWidth(name, size) + 0.6;
      const [left, foot] = [frame.x + x - (anchor === 'end' ? wide : 0.3), frame.y + y];
      const [high, low] = [foot - size * 0.72, foot + size * 0.2];
      return {
        ground: area(
          1,
          point(left, high),
          point(left + wide, high),
          point(left + wide, low),
          point(left, low),
        ),
        word: words(name, frame.x + x, foot, size, {
          anchor,
          ...(lit ? { heavy: true } : { grey: 0.35 }),
        }),
      };
    },
  );
  return { grounds: set.map(({ ground }) => ground), words: set.map(({ word }) => word) };
}

function halfMarks(picture: StepPicture, frame: Frame): readonly Mark[] {
  const { at } = pageOf(picture.near, frame);
  const small = (path: Path): Path => pathOnPage(path, at);
  const x = at(point(0, 0)).x;
  const names = namesOf(picture.points, at, frame);
  return [
    strokes(centre, stroke(x, frame.y, x, frame.y + frame.height)),
    strokes(before, ...picture.before.map(small)),
    ...picture.cut.flatMap(({ piece }) => [
      outline(cut, small(piece.edges.flatMap((edge) => edge.path))),
      strokes(
        before,
        ...piece.darts.flatMap((dart) => [small(dart.centreLeg), small(dart.sideLeg)]),
      ),
    ]),
    ...names.grounds,
    strokes(now, ...picture.now.map(small)),
    ...picture.points.map((each) => dot(at(each.at), each.now ? dotSize.now : dotSize.before)),
    ...names.words,
  ];
}

/** Pieces apart: the cutting line outside the dashed seam line. */
function piecesMarks({ laid }: StepPicture, frame: Frame): readonly Mark[] {
  const { placed, width, height } = spread(laid);
  const { at } = pageOf({ x: 0, y: 0, width, height }, frame);
  return placed.flatMap(({ piece, translate }) => {
    const small = (path: Path): Path => pathOnPage(path, (p) => at(add(p, translate)));
    return [
      strokes(
        { width: 0.13, grey: 0.4, dash: [0.8, 0.5] },
        ...piece.edges.map((e) => small(e.path)),
      ),
      outline(cut, small(piece.cutLine)),
    ];
  });
}

/** The figure of a step within a frame of the page: what was there thin, what is new bold, its points named. */
export function worksheetFigure(told: Told, place: number, frame: Frame): readonly Mark[] {
  const picture = stepPicture(told, place);
  if (!picture) return [];
  const { x, y, width, height } = frame;
  const marks =
    picture.frame === 'pieces' ? piecesMarks(picture, frame) : halfMarks(picture, frame);
  return [{ kind: 'window', box: frame, marks }, box(pens.hairline, x, y, width, height)];
}
