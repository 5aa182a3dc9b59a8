import { flatten } from '../geometry/curve.ts';
import type { Piece, Side } from '../drafting/piece.ts';
import type { Drafted } from '../engine/drafted.ts';
import type { Paper } from '../sheets/papers.ts';
import { printerMargin } from '../sheets/tile-grid.ts';
import { type OnPage, quarter } from './chalk-half.ts';
import { type ChalkPoint, chalkPoints } from './chalk-points.ts';
import type { Column } from './row-flow.ts';

/** Where the drawings begin, the letters of the levels left of them, and the white between, mm. */
const drawingsTop = 39;
const lettersRoom = 5;
const between = 9;
const gutter = 4.5;
const columnWidth = 43;

/** Narrowest column whose rows still read. */
const narrowest = 28;

/** One half of the gown on the page: its centre line at `x`. */
export type Half = {
  readonly title: string;
  readonly pieces: readonly Piece[];
  readonly points: readonly ChalkPoint[];
  readonly x: number;
  readonly right: number;
  readonly onPage: OnPage;
  /** The blank cloth between hip and knee, where its own table stands; none where it is too narrow. */
  readonly inside: readonly Column[];
};

export type ChalkLayout = {
  readonly front: Half;
  readonly back: Half;
  /** Where a height of the body stands on the page. */
  readonly yOf: (y: number) => number;
  /** Whether the stretch below the hip is drawn shorter than a quarter, to fit the page. */
  readonly shortened: boolean;
  readonly columns: readonly Column[];
};

/** A half before it has a place on the page. */
export type Bare = Pick<Half, 'title' | 'pieces' | 'points'>;

function halfOf(draft: Drafted, side: Side, first: number): Bare {
  const pieces = draft.pieces.filter(
    (each) => each.side === side && (each.part === 'top' || each.part === 'middle'),
  );
  const title = side === 'front' ? 'Front, from the fold' : 'Back, from centre back';
  return { title, pieces, points: chalkPoints(pieces, draft.levels, first) };
}

const widthOf = ({ points }: Bare): number =>
  Math.max(0, ...points.map((each) => each.at.x)) * quarter;

/** How far a half reaches over its centre line, where its centre seam runs outwards below the knee. */
const overCentre = ({ points }: Bare): number =>
  Math.max(0, ...points.map((each) => -each.at.x)) * quarter;

/** The room inside a half: below its darts, above the knee seam, left of its side seam. */
function insideOf(
  half: Bare,
  draft: Drafted,
  x: number,
  yOf: (y: number) => number,
): readonly Column[] {
  const middle = half.pieces.find((each) => each.part === 'middle');
  const side = middle?.edges.find((each) => each.kind === 'side');
  const { 'top-hip': topHip, 'knee-seam': knee, hem } = draft.levels;
  const until = knee ?? hem;
  if (!middle || !side || topHip === undefined || until === undefined) return [];
  const legs = middle.darts.flatMap((dart) => [...dart.centreLeg, ...dart.sideLeg]);
  const from = Math.max(topHip, ...legs.map((each) => each.to.y));
  const reach = flatten(side.path, 1).filter((each) => each.y >= from && each.y <= until + 5);
  const room = (to: number): number =>
    Math.min(...reach.filter((each) => each.y <= to + 5).map((each) => each.x)) * quarter - 9;
  const first = Math.min(room(until), columnWidth);
  if (first < narrowest) return [];
  const [y, bottom] = [yOf(from) + 2, yOf(until) - 4];
  const second = [1, 0.9, 0.8, 0.7, 0.6, 0.5]
    .map((share) => from + (until - from) * share)
    .find((to) => room(to) - first - gutter >= narrowest);
  return [
    { x: x + 3.5, y, width: first, bottom },
    ...(second === undefined
      ? []
      : [
          {
            x: x + 3.5 + first + gutter,
            y,
            width: Math.min(room(second) - first - gutter, columnWidth),
            bottom: Math.min(bottom, yOf(second)),
          },
        ]),
  ];
}

/** As many columns as stand side by side between two edges. */
function columnsBetween(from: number, to: number, y: number, bottom: number): readonly Column[] {
  const count = Math.floor((to - from + gutter) / (columnWidth + gutter));
  const width = Math.min((to - from - (count - 1) * gutter) / count, columnWidth * 1.2);
  return Array.from({ length: Math.max(0, count) }, (_, i) => ({
    x: to - (count - i) * width - (count - 1 - i) * gutter,
    y,
    width,
    bottom,
  }));
}

/** Front and back with their points, numbered on from one to the other. */
export function chalkHalves(draft: Drafted): readonly [front: Bare, back: Bare] {
  const front = halfOf(draft, 'front', 1);
  return [front, halfOf(draft, 'back', front.points.length + 1)];
}

/**
 * Where the two halves, and the columns of figures, stand on the page, down to `bottom`, with
 * `reserve` mm kept free of drawing above it. On the widest
 * bodies the halves run into one another at the hip, and on the tallest the plain stretch from hip to
 * knee is drawn shorter; the figures stay.
 */
export function layChalkSheet(
  draft: Drafted,
  [front, back]: readonly [Bare, Bare],
  paper: Paper,
  bottom: number,
  reserve: number,
): ChalkLayout {
  const left = printerMargin;
  const edge = paper.width - printerMargin;
  const heights = [...front.points, ...back.points].map((each) => each.at.y);
  const top = Math.min(...heights);
  const lowest = Math.max(...heights);
  const { hip = lowest } = draft.levels;
  const plain = (y: number): number => drawingsTop + (y - top) * quarter;
  const below = Math.min(1, (bottom - reserve - plain(hip)) / (plain(lowest) - plain(hip)));
  const yOf = (y: number): number =>
    y <= hip ? plain(y) : plain(hip) + (y - hip) * quarter * below;
  const onPageFrom =
    (x: number): OnPage =>
    (at) => ({ x: x + at.x * quarter, y: yOf(at.y) });
  const room = edge - left - lettersRoom - widthOf(front) - widthOf(back) - overCentre(back);
  const frontX = left + lettersRoom;
  const backX = frontX + widthOf(front) + overCentre(back) + Math.min(between, room);
  const right = backX + widthOf(back);
  const drawingsBottom = yOf(lowest);
  return {
    front: {
      ...front,
      x: frontX,
      right: frontX + widthOf(front),
      onPage: onPageFrom(frontX),
      inside: insideOf(front, draft, frontX, yOf),
    },
    back: {
      ...back,
      x: backX,
      right,
      onPage: onPageFrom(backX),
      inside: insideOf(back, draft, backX, yOf),
    },
    yOf,
    shortened: below < 1,
    columns: [
      ...columnsBetween(right + 6, edge, drawingsTop - 8, drawingsBottom),
      ...columnsBetween(left, edge, drawingsBottom + 4, bottom),
    ],
  };
}
