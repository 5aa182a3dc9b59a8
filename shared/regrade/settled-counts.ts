import type { HouseRules } from '../drafting/house-rules.ts';
import type { FinishedPiece, Side } from '../drafting/piece.ts';
import { isOuter } from '../compare/comparable.ts';

/** Waist darts by whatever name: they are numbered from the centre out. */
const isWaistDart = (name: string): boolean => /^waist(-\d+)?$/.test(name);

/** Most waist darts in one piece of a half; a seam above shares them with its panels. */
function dartsIn(pieces: readonly FinishedPiece[], side: Side): 1 | 2 | undefined {
  const counts = pieces
    .filter((piece) => piece.side === side && isOuter(piece) && piece.part !== 'flare')
    .map(({ darts }) => darts.filter(({ name }) => isWaistDart(name)).length);
  const most = Math.max(0, ...counts);
  if (most === 0) return undefined;
  return most === 1 ? 1 : 2;
}

const goresIn = (pieces: readonly FinishedPiece[], side: Side): number =>
  pieces.filter((piece) => piece.side === side && piece.part === 'flare' && isOuter(piece)).length;

/** A number for each half that has one. */
const halves = <N extends number>(of: (side: Side) => N | undefined) => {
  const [front, back] = [of('front'), of('back')];
  return {
    ...(front === undefined ? {} : { front }),
    ...(back === undefined ? {} : { back }),
  };
};

/** The numbers of darts and gores a draft has come to, for other sizes to be drawn with. */
export const settledCounts = (
  pieces: readonly FinishedPiece[],
): NonNullable<HouseRules['counts']> => ({
  darts: halves((side) => dartsIn(pieces, side)),
  gores: halves((side) => goresIn(pieces, side) || undefined),
});
