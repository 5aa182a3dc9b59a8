import type { Body } from '../../body/card.ts';
import type { PartTable } from '../../drafting/drafting-table.ts';
import { edge } from '../../drafting/outline.ts';
import type { InnerLine, Piece } from '../../drafting/piece.ts';
import { line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { mm, said } from '../../units/said.ts';

/** The stay is shorter than the body's waist by this, of 10 to 25 (reference.md 3d, common practice). */
const snug = 15;
/** Grosgrain this wide, with this much at each end for hooks and eyes. */
const width = 25;
const forHooks = 30;

/** The ribbon that holds the gown at the waist, half of it, on the fold at the centre front. */
function ribbon(waist: number): Piece {
  const half = (waist - snug) / 2 + forHooks;
  const [a, b, c, d] = [point(0, 0), point(half, 0), point(half, width), point(0, width)];
  return {
    name: 'waist-stay',
    title: 'Waist stay',
    side: 'front',
    part: 'inner',
    cloth: 'ribbon',
    cut: 'cut 1 on fold',
    copies: 1,
    edges: [
      edge('upper', 'facing', [line(a, b)]),
      edge('end', 'facing', [line(b, c)]),
      edge('lower', 'facing', [line(c, d)]),
      edge('centre', 'fold', [line(d, a)]),
    ],
    darts: [],
    levels: [],
    notches: [
      {
        name: 'hook',
        edge: 'upper',
        at: point(half - forHooks, 0),
        outward: point(0, -1),
        strokes: 1,
      },
    ],
    grain: { from: point(half * 0.6, width / 2), to: point(half * 0.9, width / 2) },
    drills: [],
  };
}

const stayLine = (piece: Piece): readonly InnerLine[] =>
  piece.part === 'inner'
    ? []
    : piece.levels
        .filter(({ level }) => level === 'waist')
        .map(({ from, to }) => ({ name: 'waist-stay', kind: 'stay', path: [line(from, to)] }));

/** The gown with a waist stay: the ribbon, and the line it lies on. */
export function stayWaist(
  paper: PartTable,
  pieces: readonly Piece[],
  { measures: { waistGirth } }: Body,
): readonly Piece[] {
  const stay = ribbon(waistGirth);
  paper.draw(
    'Waist stay',
    said`A ribbon ${mm(width)} wide: the waist ${mm(waistGirth, ['waistGirth'])} less ${mm(snug)} = ${mm(waistGirth - snug, ['waistGirth'])} from hook to eye, and ${mm(forHooks)} at each end for them. Catch it to the seams at the waist and leave it free beside the closure.`,
    {
      why: said`Hooked before the gown is closed it carries the weight at the waist, so that the closure is not strained and the top edge does not slip. It must leave room for a full breath.`,
      measures: ['waistGirth'],
      pieces: [stay.name],
    },
  );
  return [
    ...pieces.map((piece) => {
      const lines = stayLine(piece);
      return lines.length === 0 ? piece : { ...piece, lines: [...(piece.lines ?? []), ...lines] };
    }),
    stay,
  ];
}
