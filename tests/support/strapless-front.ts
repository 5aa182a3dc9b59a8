import { edge, levelLine, mouth } from '#shared/drafting/outline.ts';
import type { Piece } from '#shared/drafting/piece.ts';
import { type Path, cubic, line } from '#shared/geometry/path.ts';
import { point } from '#shared/geometry/point.ts';

/** The bust point of the strapless front. */
export const straplessBustPoint = point(100, 263);

/** A strapless front made up by us: a top line from the centre to the side, one dart in the waist to the bust point. */
export function straplessFront(): Piece {
  const top: Path = [
    cubic(point(0, 210), point(40, 210), point(70, 178), point(110, 178)),
    cubic(point(110, 178), point(160, 178), point(200, 215), point(248, 228)),
  ];
  const [near, far] = [point(78, 436), point(122, 436)];
  return {
    name: 'front-top',
    title: 'Strapless front',
    side: 'front',
    part: 'top',
    cut: 'cut 1 on fold',
    copies: 1,
    edges: [
      edge('top', 'top', top),
      edge('side', 'side', [line(point(248, 228), point(225, 438))], {
        piece: 'back-top',
        edge: 'side',
      }),
      edge('waist-b', 'seam', [line(point(225, 438), far)]),
      mouth('waist-mouth-a', far, near),
      edge('waist-a', 'seam', [line(near, point(0, 433))]),
      edge('centre', 'fold', [line(point(0, 433), point(0, 210))]),
    ],
    darts: [
      {
        name: 'waist',
        tip: 'above',
        centreLeg: [line(near, straplessBustPoint)],
        sideLeg: [line(far, straplessBustPoint)],
        mouth: 'waist-mouth-a',
        pressed: 'centre',
      },
    ],
    levels: [levelLine('bust', point(0, 263), point(244.2, 263))],
    notches: [],
    grain: { from: point(40, 280), to: point(40, 420) },
    drills: [point(100, 288)],
  };
}
