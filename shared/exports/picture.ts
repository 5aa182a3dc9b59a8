import type { FinishedPiece } from '../drafting/piece.ts';
import { flatten } from '../geometry/curve.ts';
import { spread } from './spread.ts';

/** Outlines of pieces as one SVG path in a box from 0, 0. */
export type PicturePath = {
  readonly width: number;
  readonly height: number;
  readonly path: string;
};

/** Longer side of the box. */
const size = 160;

/**
 * A small picture of a gown's pieces for lists: their cutting lines laid out as on the drafting
 * table, in whole numbers and so some hundred letters long. No answer without pieces.
 */
export function picturePath(pieces: readonly FinishedPiece[]): PicturePath | undefined {
  if (pieces.length === 0) return undefined;
  const { placed, width, height } = spread(pieces);
  const mmEach = Math.max(width, height) / size;
  const outlines = placed.map(({ piece, translate }) => {
    let last = '';
    const places = flatten(piece.cutLine, mmEach / 2).flatMap(({ x, y }) => {
      const place = [x + translate.x, y + translate.y].map((each) => Math.round(each / mmEach));
      const written = place.join(' ');
      if (written === last) return [];
      last = written;
      return [written];
    });
    return `M${places.join('L')}Z`;
  });
  return {
    width: Math.ceil(width / mmEach),
    height: Math.ceil(height / mmEach),
    path: outlines.join(''),
  };
}
