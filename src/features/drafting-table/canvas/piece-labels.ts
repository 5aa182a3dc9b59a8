import type { Point } from '#shared/geometry/point.ts';

import type { Layout, Placed } from './layout.ts';
import { shortTitle } from './short-title.ts';
import { toScreen, type Box, type View } from './view.ts';

/** What is lettered on a piece, pixels: middled on `at.x`, the first base line at `at.y`. */
export type PieceLabel = {
  readonly piece: string;
  readonly title: readonly string[];
  readonly cut?: string;
  readonly fault?: string;
  readonly small: boolean;
  readonly at: Point;
  /** From the name to its piece, where the name has no room on it. */
  readonly hairline?: readonly [Point, Point];
};

type Words = Pick<PieceLabel, 'title' | 'cut' | 'fault' | 'small'>;

/** Sizes of letters and lines, pixels; the width of a letter is a middling one of the typeface. */
const large = { letter: 6.9, line: 17 };
const small = { letter: 5.9, line: 14 };

/** How far down a piece its name stands: clear of the handles along a top edge, and of the tips of darts. */
const shares = { top: 0.66, middle: 0.45, flare: 0.5, sleeve: 0.5, inner: 0.5 };
const lowShares = { ...shares, middle: 0.68 };

/** How far outside its piece a name is tried, one place after the other. */
const away = [6, 14, 22];

/** And how far to the side above it. */
const aside = [0, 9, -9];

/**
 * A name for every piece at this zoom. First the cut line gives way, then the long title to the short one, then
 * one line to two; where a piece is too small for any, its name stands beside it at the end of a hairline, if there
 * is a free place; linings and stays go without where there is none.
 */
export function pieceLabels(
  layout: Layout,
  view: View,
  faultOf: (piece: string) => string | undefined,
): readonly PieceLabel[] {
  const boxes = layout.placed.map(({ box }) => onScreen(box, view));
  const taken: Box[] = [];
  return layout.placed.flatMap((placed, index): PieceLabel[] => {
    const { piece } = placed;
    const box = boxes[index] ?? onScreen(placed.box, view);
    const fault = faultOf(piece.name);
    const within = ways(placed, fault).find((words) => fits(words, box));
    if (within !== undefined) {
      const at = centred(
        within,
        box,
        within.title.length > 1 ? lowShares[piece.part] : shares[piece.part],
      );
      taken.push(around(within, at));
      return [{ piece: piece.name, ...within, at }];
    }
    const words: Words = { title: stacked(piece), small: true, ...(fault && { fault }) };
    const others = [...taken, ...boxes.filter((_, other) => other !== index)];
    const free = beside(words, box, others);
    // From afar names would lie over each other: what goes inside gives way, unless it has a fault.
    if (free === undefined && fault === undefined && piece.part === 'inner') return [];
    const place = free ?? { at: centred(words, box, 0.5) };
    taken.push(around(words, place.at));
    return [{ piece: piece.name, ...words, ...place }];
  });
}

/** From the fullest lettering to the shortest. */
function ways({ piece }: Placed, fault: string | undefined): readonly Words[] {
  const brief = shortTitle(piece);
  const also = fault === undefined ? {} : { fault };
  return [
    { title: [piece.title], cut: piece.cut, small: false, ...also },
    { title: [brief], cut: piece.cut, small: false, ...also },
    { title: [piece.title], small: false, ...also },
    { title: [brief], small: false, ...also },
    { title: [brief], small: true, ...also },
    { title: stacked(piece), small: true, ...also },
  ];
}

/** `Front` over `side`. */
function stacked(piece: Placed['piece']): readonly string[] {
  const [half = '', ...rest] = shortTitle(piece).split(' ');
  return [half, rest.join(' ')];
}

const sizeOf = (words: Words) => (words.small ? small : large);
const lineOf = (words: Words): number => sizeOf(words).line;

const linesOf = ({ title, cut, fault }: Words): readonly string[] =>
  [...title, cut, fault].filter((line) => line !== undefined);

const widthOf = (words: Words): number =>
  Math.max(...linesOf(words).map((line) => line.length)) * sizeOf(words).letter;

const heightOf = (words: Words): number => linesOf(words).length * lineOf(words);

const fits = (words: Words, box: Box): boolean =>
  widthOf(words) <= box.right - box.left && heightOf(words) <= box.bottom - box.top;

/** Where words start that are centred so far down a box. */
const centred = (words: Words, box: Box, share: number): Point => ({
  x: (box.left + box.right) / 2,
  y: box.top + (box.bottom - box.top) * share - heightOf(words) / 2 + lineOf(words) * 0.8,
});

function around(words: Words, at: Point): Box {
  const half = widthOf(words) / 2;
  const top = at.y - lineOf(words) * 0.8;
  return { left: at.x - half, right: at.x + half, top, bottom: top + heightOf(words) };
}

/** The nearest free place above, under or beside a piece, with a hairline to its middle; none where all is full. */
function beside(
  words: Words,
  box: Box,
  others: readonly Box[],
): Required<Pick<PieceLabel, 'at' | 'hairline'>> | undefined {
  const middle = { x: (box.left + box.right) / 2, y: (box.top + box.bottom) / 2 };
  const half = widthOf(words) / 2;
  const rise = lineOf(words) * 0.4;
  const places = away.flatMap((off) => [
    ...aside.map((by) => ({
      x: middle.x + by,
      y: box.top - off - heightOf(words) + lineOf(words) * 0.8,
    })),
    { x: middle.x, y: box.bottom + off + lineOf(words) * 0.8 },
    { x: box.right + off + half, y: middle.y },
    { x: box.left - off - half, y: middle.y },
  ]);
  const free = (at: Point): boolean => {
    const own = around(words, at);
    return own.left > 28 && own.top > 28 && others.every((each) => apart(own, each));
  };
  const at = places.find(free);
  if (at === undefined) return undefined;
  const below = at.y > middle.y;
  const foot = at.y + (words.title.length - 1) * lineOf(words) + 2;
  return { at, hairline: [{ x: at.x, y: below ? at.y - rise * 2 : foot }, middle] };
}

/** So much two boxes may overlap: widths of letters are reckoned on the broad side, pixels. */
const shy = 4;

const apart = (a: Box, b: Box): boolean =>
  a.right < b.left + shy ||
  b.right < a.left + shy ||
  a.bottom < b.top + shy ||
  b.bottom < a.top + shy;

function onScreen(box: Box, view: View): Box {
  const from = toScreen(view, { x: box.left, y: box.top });
  const to = toScreen(view, { x: box.right, y: box.bottom });
  return { left: from.x, top: from.y, right: to.x, bottom: to.y };
}
