import type { EdgeRef } from '#shared/drafting/piece.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import type { SeamRow } from '#shared/proof/proof.ts';
import { formatLength } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';

/** Two edges that are sewn together, as they light up: each with its words and its length. */
export type LitSeam = {
  readonly title: string;
  readonly edges: readonly EdgeRef[];
  readonly lines: readonly string[];
};

const same = (a: EdgeRef, b: EdgeRef): boolean => a.piece === b.piece && a.edge === b.edge;

/** The seam in trade words: `Princess seam`, `Side seam`; a stretch of one by where it lies: `Waist seam, at the side`. */
export function seamWord({ first, second }: SeamRow, draft: Drafted): string {
  const [, seam = first.edge, letter] = stretch.exec(first.edge) ?? [];
  const name = `${seam === 'centre' ? 'centre back' : seam.replaceAll('-', ' ')} seam`;
  const places = Math.max(...[first, second].map((each) => stretchesOf(each.piece, seam, draft)));
  const words = letter === undefined ? name : `${name}, ${placeWords(letter, places)}`;
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** A seam parted by darts or gores is lettered from the centre line out. */
const stretch = /^(.*)-([a-z])$/;

const stretchesOf = (piece: string, seam: string, draft: Drafted): number =>
  draft.pieces
    .find(({ name }) => name === piece)
    ?.edges.filter((edge) => edge.open !== true && stretch.exec(edge.name)?.[1] === seam).length ??
  0;

const letters = 'abcdefghijkl';

function placeWords(letter: string, places: number): string {
  const place = letters.indexOf(letter);
  if (place === 0) return 'at the centre';
  if (place === places - 1) return 'at the side';
  return places === 3 ? 'between' : `stretch ${place + 1} from the centre`;
}

/** The pieces a seam joins, as the maker reads them. */
export function seamPieces({ first, second }: SeamRow, draft: Drafted): string {
  const titles = [first, second].map(
    ({ piece }) => draft.pieces.find((each) => each.name === piece)?.title ?? piece,
  );
  return [...new Set(titles)].join(' – ');
}

/** Place of the seam an edge belongs to among the seams walked; -1 where the edge is sewn to no other. */
export const seamIndex = (draft: Drafted, edge: EdgeRef | undefined): number =>
  edge === undefined
    ? -1
    : draft.proof.seams.findIndex(({ first, second }) => same(first, edge) || same(second, edge));

/** The seam an edge belongs to with both lengths; an edge sewn to no other has none. */
export function litSeam(
  draft: Drafted,
  edge: EdgeRef | undefined,
  unit: Unit,
): LitSeam | undefined {
  const row = draft.proof.seams[seamIndex(draft, edge)];
  if (row === undefined) return undefined;
  const titleOf = (name: string) => draft.pieces.find((each) => each.name === name)?.title ?? name;
  const alone = same(row.first, row.second);
  return {
    title: seamWord(row, draft),
    edges: [row.first, row.second],
    lines: (alone ? [row.first] : [row.first, row.second]).map(
      (each) => `${titleOf(each.piece)}: ${formatLength(each.length, unit)}`,
    ),
  };
}
