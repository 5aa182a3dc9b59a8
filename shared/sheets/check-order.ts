import type { Piece } from '../drafting/piece.ts';
import { readingGrace } from '../units/format-length.ts';
import { error, type Problem } from '../units/problem.ts';
import { mm, said } from '../units/said.ts';
import { type CustomPaper, type PieceOrder, type PrintOrder, orderLimits } from './print-order.ts';
import { waysToDraw } from './ways-to-draw.ts';

type Bounds = { readonly least: number; readonly most: number };

const within = (value: number, { least, most }: Bounds): boolean =>
  value >= least - readingGrace && value <= most + readingGrace;

const outOfRange = (field: string, words: Problem['said']): Problem =>
  error({ code: 'out-of-range', field, said: words });

/** What is wrong with the white round the sheets, if anything; mm. */
export const checkMargin = (margin: number): readonly Problem[] =>
  within(margin, orderLimits.margin)
    ? []
    : [
        outOfRange(
          'order.margin',
          said`The margin ${mm(margin)} must lie between ${mm(orderLimits.margin.least)} and ${mm(orderLimits.margin.most)}: most home printers leave ${mm(10)} white or less.`,
        ),
      ];

/** What is wrong with the strip that sheets share, if anything; mm. */
export const checkOverlap = (overlap: number): readonly Problem[] =>
  within(overlap, orderLimits.overlap)
    ? []
    : [
        outOfRange(
          'order.overlap',
          said`The overlap ${mm(overlap)} must lie between ${mm(orderLimits.overlap.least)} and ${mm(orderLimits.overlap.most)}: ${mm(10)} holds a glue strip well.`,
        ),
      ];

/** What is wrong with a sheet of the maker's own, by its width and height; mm. */
export function checkPaper({ width, height }: CustomPaper): readonly Problem[] {
  const [shortSide, longSide] =
    width <= height ? (['width', 'height'] as const) : (['height', 'width'] as const);
  const sides = [
    { side: shortSide, value: Math.min(width, height), bounds: orderLimits.shortSide },
    { side: longSide, value: Math.max(width, height), bounds: orderLimits.longSide },
  ];
  return sides
    .filter(({ value, bounds }) => !within(value, bounds))
    .map(({ side, value, bounds }) =>
      outOfRange(
        `order.paper.${side}`,
        said`The ${side} ${mm(value)} must lie between ${mm(bounds.least)} and ${mm(bounds.most)}: measure the sheet again, the cover with its test squares has to fit on it.`,
      ),
    );
}

function checkPiece(
  { piece, copies, how }: PieceOrder,
  at: number,
  drafted: readonly Piece[],
): readonly Problem[] {
  const field = `order.pieces.${at}`;
  const found = drafted.find(({ name }) => name === piece);
  if (found === undefined) {
    const names = drafted.map(({ name }) => `“${name}”`).join(', ');
    return [
      error({
        code: 'unknown-piece',
        field: `${field}.piece`,
        said: said`This draft has no piece “${piece}”: choose among ${names}.`,
      }),
    ];
  }
  const { least, most } = orderLimits.copies;
  const problems: Problem[] = [];
  if (!Number.isInteger(copies) || copies < least || copies > most) {
    problems.push(
      outOfRange(
        `${field}.copies`,
        said`${found.title} can be printed ${least} to ${most} times, in whole numbers, not ${String(copies)}: print again for more.`,
      ),
    );
  }
  const ways = waysToDraw(found);
  if (!ways.includes(how)) {
    problems.push(
      error({
        code: 'wrong-way',
        field: `${field}.how`,
        said: said`${found.title} cannot be “${how}”: choose ${ways.map((each) => `“${each}”`).join(' or ')}.`,
      }),
    );
  }
  return problems;
}

/** A piece listed again, or more outlines than are laid out together: copies are asked for by number. */
function checkCount(listed: readonly PieceOrder[]): readonly Problem[] {
  const names = listed.map(({ piece }) => piece);
  const twice = names.findIndex((name, at) => names.indexOf(name) !== at);
  const drawings = listed.reduce(
    (sum, { copies, how }) => sum + copies * (how === 'mirrored pair' ? 2 : 1),
    0,
  );
  return [
    ...(twice < 0
      ? []
      : [
          error({
            code: 'piece-twice',
            field: `order.pieces.${twice}.piece`,
            said: said`The piece “${names[twice] ?? ''}” is listed twice: list it once, with its copies.`,
          }),
        ]),
    ...(drawings <= orderLimits.drawings
      ? []
      : [
          outOfRange(
            'order.pieces',
            said`That is ${drawings} outlines with all copies and pairs; at most ${orderLimits.drawings} are laid out together: print in two goes.`,
          ),
        ]),
  ];
}

/**
 * What is wrong with an order for these pieces: figures outside their bounds, no piece at all, pieces the
 * draft has not got. Fields are those of the contract (`order.margin`).
 */
export function checkOrder(order: PrintOrder, drafted: readonly Piece[]): readonly Problem[] {
  const { paper, margin, overlap, pieces } = order;
  const listed = typeof pieces === 'string' ? [] : pieces;
  const none =
    typeof pieces === 'string'
      ? pieces === 'bodice-toile' && drafted.every(({ part }) => part !== 'top')
      : pieces.length === 0;
  return [
    ...(typeof paper === 'string' ? [] : checkPaper(paper)),
    ...checkMargin(margin),
    ...checkOverlap(overlap),
    ...listed.flatMap((each, at) => checkPiece(each, at, drafted)),
    ...checkCount(listed),
    ...(none
      ? [
          error({
            code: 'no-pieces',
            field: 'order.pieces',
            said: said`No piece is chosen: tick at least one.`,
          }),
        ]
      : []),
  ];
}
