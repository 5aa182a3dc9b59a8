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
import type { Drawing, Mark, Words } from './drawing.ts';
import { levelTitles } from './level-titles.ts';
import { type LineStyle, markScale, penIn, plainLines } from './line-style.ts';
import { area, chainOf, outline, pens, stroke, strokes, words } from './marks.ts';

/** Lengths of the small marks on a piece, mm. */
const tickLength = 8;
const arrow = 5;
const bracket = { inset: 12, fromEnds: 40 };
const drill = 2;

const straight = (from: Point, to: Point): Path => stroke(from.x, from.y, to.x, to.y);

/** An arrowhead with its tip at `tip`, flying along `way`. */
function arrowhead(tip: Point, way: Point, style: LineStyle): Mark {
  const long = arrow * markScale(style);
  const back = subtract(tip, scale(way, long));
  const half = scale(turnRight(way), long / 4);
  const [left, right] = [add(back, half), subtract(back, half)];
  return style.inkSaving
    ? strokes(penIn(pens.grain, style), chainOf([left, tip, right]))
    : area(0, tip, left, right);
}

/** Text along a line, upright or read from the right, never upside down. */
export function lettersAlong(
  text: string,
  from: Point,
  to: Point,
  size: number,
  off: number,
): Mark {
  const way = unit(subtract(to, from));
  const readable = way.x < -1e-6 || (Math.abs(way.x) <= 1e-6 && way.y > 0) ? scale(way, -1) : way;
  const at = add(between(from, to, 0.5), scale(turnRight(readable), -off));
  return words(text, at.x, at.y, size, {
    anchor: 'middle',
    turn: (Math.atan2(readable.y, readable.x) * 180) / Math.PI,
  });
}

const grainMarks = ({ from, to }: FinishedPiece['grain'], style: LineStyle): readonly Mark[] => {
  const way = unit(subtract(to, from));
  return [
    strokes(penIn(pens.grain, style), straight(from, to)),
    arrowhead(to, way, style),
    arrowhead(from, scale(way, -1), style),
    lettersAlong('grain', from, between(from, to, 0.5), 3.5 * markScale(style), 1.5),
  ];
};

/** A bracket inside the fold, its two arrows pointing at it. */
function foldMarks(path: Path, style: LineStyle): readonly Mark[] {
  const start = startOf(path);
  const end = endOf(path);
  if (!start || !end) return [];
  const way = unit(subtract(end, start));
  const inward = turnRight(way);
  const short = Math.min(bracket.fromEnds, distance(start, end) / 5);
  const [a, b] = [add(start, scale(way, short)), subtract(end, scale(way, short))];
  const inset = bracket.inset * markScale(style);
  const [innerA, innerB] = [add(a, scale(inward, inset)), add(b, scale(inward, inset))];
  const size = 4 * markScale(style);
  return [
    strokes({ width: 0.9, dash: [3, 9], grey: 1 }, path),
    strokes(penIn(pens.fold, style), chainOf([a, innerA, innerB, b])),
    arrowhead(a, scale(inward, -1), style),
    arrowhead(b, scale(inward, -1), style),
    lettersAlong('place on fold', innerA, innerB, size, -1.25 * size),
  ];
}

/** Smaller drawings than this have no room for the names of their levels. */
const namedFrom = 0.5;

/** Ticks at the two ends of a level, its name beside the outer one. */
function levelMarks({ level, from, to }: LevelLine, style: LineStyle): readonly Mark[] {
  const way = unit(subtract(to, from));
  const length = Math.min(tickLength, distance(from, to) / 3);
  const inner = subtract(to, scale(way, length + 1));
  return [
    strokes(
      penIn(pens.hairline, style),
      straight(from, add(from, scale(way, length))),
      straight(to, subtract(to, scale(way, length))),
    ),
    ...(style.scale < namedFrom
      ? []
      : [words(levelTitles[level], inner.x, inner.y + 0.9, 2.6, { anchor: 'end', grey: 0.35 })]),
  ];
}

const drillPaths = (at: Point): readonly Path[] => [
  stroke(at.x - drill, at.y, at.x + drill, at.y),
  stroke(at.x, at.y - drill, at.x, at.y + drill),
];

/** How far a notch is drawn into a piece whose cutting line is not drawn, mm. */
const notchInward = 6;

/** Notches from the cutting line in; on a finished line alone they stand inside it. */
const notchPaths = ({ notchMarks }: FinishedPiece, style: LineStyle): readonly Path[] =>
  notchMarks.flatMap(({ strokes: marks }) =>
    marks.map(({ from, to }): Path => {
      if (style.lines !== 'finished') return straight(from, to);
      const inward = scale(unit(subtract(from, to)), notchInward * markScale(style));
      return straight(from, add(from, inward));
    }),
  );

/** Pens of lines inside a piece: bones and stays dash and dot, folds dashed, where folds come to lie thin. */
const innerPens = {
  boning: { width: 0.3, dash: [6, 1.5, 1, 1.5] },
  stay: { width: 0.3, dash: [6, 1.5, 1, 1.5] },
  'pleat-fold': { width: 0.3, dash: [5, 2] },
  'pleat-place': { width: 0.2 },
  stitching: { width: 0.2, dash: [2, 1.5] },
} as const;

/** The outline of a piece: its cutting line, its seam line, or both; a small drawing has no line to cut on. */
function outlines(piece: FinishedPiece, style: LineStyle): readonly Mark[] {
  const sewn = piece.edges.filter((each) => each.kind !== 'fold' && each.open !== true);
  const seams = sewn.map((each) => each.path);
  if (style.lines === 'finished') {
    return [
      outline(
        penIn(pens.cut, style),
        piece.edges.flatMap((each) => each.path),
      ),
    ];
  }
  const cut = style.scale < 1 ? { ...pens.cut, dash: [12, 1.5] } : pens.cut;
  return [
    outline(penIn(cut, style), piece.cutLine),
    ...(style.lines === 'both' ? [strokes(penIn(pens.seam, style), ...seams)] : []),
  ];
}

/** The label of a piece, its name heavy. */
export const labelMarks = (
  { title }: Pick<FinishedPiece, 'title'>,
  lettering: FinishedPiece['lettering'],
): readonly Words[] =>
  lettering.map(({ text, at, size }) =>
    words(text, at.x, at.y, size, { heavy: title.includes(text) }),
  );

/**
 * A piece without its label in the trade's lines: cutting line solid, seam line dashed, dart legs thin,
 * fold bracketed, grain a double arrow, notches as strokes from the cutting line, levels as ticks. In the
 * piece's own coordinates, mm.
 */
export function pieceLines(piece: FinishedPiece, style: LineStyle): readonly Mark[] {
  const folds = piece.edges.filter((each) => each.kind === 'fold');
  return [
    ...outlines(piece, style),
    ...folds.flatMap((each) => foldMarks(each.path, style)),
    strokes(
      penIn(pens.dart, style),
      ...piece.darts.flatMap((each) => [each.centreLeg, each.sideLeg]),
      ...piece.drills.flatMap(drillPaths),
    ),
    ...(piece.lines ?? []).map((each) => strokes(penIn(innerPens[each.kind], style), each.path)),
    strokes(penIn(pens.notch, style), ...notchPaths(piece, style)),
    ...piece.levels.flatMap((each) => levelMarks(each, style)),
    ...grainMarks(piece.grain, style),
  ];
}

/** A piece as on the drafting table, its label in it. */
export const drawPiece = (piece: FinishedPiece): Drawing => ({
  name: piece.name,
  marks: [...pieceLines(piece, plainLines), ...labelMarks(piece, piece.lettering)],
});
