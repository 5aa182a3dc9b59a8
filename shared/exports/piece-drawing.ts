import { endOf, startOf } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import {
  type Point,
  add,
  between,
  distance,
  scale,
  subtract,
  turnRight,
  unit,
} from '../geometry/point.ts';
import type { FinishedPiece, LevelLine } from '../drafting/piece.ts';
import type { Drawing, Mark } from './drawing.ts';
import { levelTitles } from './level-titles.ts';
import { area, chainOf, outline, pens, stroke, strokes, words } from './marks.ts';

/** Lengths of the small marks on a piece, mm. */
const tickLength = 8;
const arrow = 5;
const bracket = { inset: 12, fromEnds: 40 };
const drill = 2;

const straight = (from: Point, to: Point): Path => stroke(from.x, from.y, to.x, to.y);

/** An arrowhead with its tip at `tip`, flying along `way`. */
function arrowhead(tip: Point, way: Point, long: number): Mark {
  const back = subtract(tip, scale(way, long));
  const half = scale(turnRight(way), long / 4);
  return area(0, tip, add(back, half), subtract(back, half));
}

/** Text along a line, upright or read from the right, never upside down. */
function lettersAlong(text: string, from: Point, to: Point, size: number, off: number): Mark {
  const way = unit(subtract(to, from));
  const readable = way.x < -1e-6 || (Math.abs(way.x) <= 1e-6 && way.y > 0) ? scale(way, -1) : way;
  const at = add(between(from, to, 0.5), scale(turnRight(readable), -off));
  return words(text, at.x, at.y, size, {
    anchor: 'middle',
    turn: (Math.atan2(readable.y, readable.x) * 180) / Math.PI,
  });
}

const grainMarks = ({ from, to }: FinishedPiece['grain']): readonly Mark[] => {
  const way = unit(subtract(to, from));
  return [
    strokes(pens.grain, straight(from, to)),
    arrowhead(to, way, arrow),
    arrowhead(from, scale(way, -1), arrow),
    lettersAlong('grain', from, between(from, to, 0.5), 3.5, 1.5),
  ];
};

/** A bracket inside the fold, its two arrows pointing at it. */
function foldMarks(path: Path): readonly Mark[] {
  const start = startOf(path);
  const end = endOf(path);
  if (!start || !end) return [];
  const way = unit(subtract(end, start));
  const inward = turnRight(way);
  const short = Math.min(bracket.fromEnds, distance(start, end) / 5);
  const [a, b] = [add(start, scale(way, short)), subtract(end, scale(way, short))];
  const [innerA, innerB] = [
    add(a, scale(inward, bracket.inset)),
    add(b, scale(inward, bracket.inset)),
  ];
  return [
    strokes({ width: 0.9, dash: [3, 9], grey: 1 }, path),
    strokes(pens.fold, chainOf([a, innerA, innerB, b])),
    arrowhead(a, scale(inward, -1), arrow),
    arrowhead(b, scale(inward, -1), arrow),
    lettersAlong('place on fold', innerA, innerB, 4, -5),
  ];
}

/** Ticks at the two ends of a level, its name beside the outer one. */
function levelMarks({ level, from, to }: LevelLine): readonly Mark[] {
  const way = unit(subtract(to, from));
  const length = Math.min(tickLength, distance(from, to) / 3);
  const inner = subtract(to, scale(way, length + 1));
  return [
    strokes(
      pens.hairline,
      straight(from, add(from, scale(way, length))),
      straight(to, subtract(to, scale(way, length))),
    ),
    words(levelTitles[level], inner.x, inner.y + 0.9, 2.6, { anchor: 'end', grey: 0.35 }),
  ];
}

const drillPaths = (at: Point): readonly Path[] => [
  stroke(at.x - drill, at.y, at.x + drill, at.y),
  stroke(at.x, at.y - drill, at.x, at.y + drill),
];

/**
 * A piece in the trade's lines: cutting line solid, seam line dashed, dart legs thin, fold bracketed,
 * grain a double arrow, notches as strokes from the cutting line, levels as ticks. In the piece's own
 * coordinates, mm.
 */
export function drawPiece(piece: FinishedPiece): Drawing {
  const folds = piece.edges.filter((each) => each.kind === 'fold');
  const sewn = piece.edges.filter((each) => each.kind !== 'fold' && each.open !== true);
  return {
    name: piece.name,
    marks: [
      outline(pens.cut, piece.cutLine),
      ...folds.flatMap((each) => foldMarks(each.path)),
      strokes(pens.seam, ...sewn.map((each) => each.path)),
      strokes(pens.dart, ...piece.darts.flatMap((each) => [each.centreLeg, each.sideLeg])),
      strokes(pens.notch, ...piece.notchMarks.flatMap((each) => each.strokes.map((one) => [one]))),
      strokes(pens.dart, ...piece.drills.flatMap(drillPaths)),
      ...piece.levels.flatMap(levelMarks),
      ...grainMarks(piece.grain),
      ...piece.lettering.map(({ text, at, size }) =>
        words(text, at.x, at.y, size, { heavy: piece.title.includes(text) }),
      ),
    ],
  };
}
