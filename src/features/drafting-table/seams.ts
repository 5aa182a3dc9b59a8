import type { EdgeRef } from '#shared/drafting/piece.ts';
import type { Draft } from '#shared/engine/draft.ts';
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

/** The seam in one trade word: `Princess`, `Side`; both edges' words where they differ. */
export function seamWord({ first, second }: SeamRow): string {
  const words = [...new Set([first.edge, second.edge].map(spoken))].join(' to ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** `waist-a` is a stretch of the waist seam, parted by a dart. */
const spoken = (edge: string): string => edge.replace(/-[a-z]$/, '').replaceAll('-', ' ');

/** The pieces a seam joins, as the maker reads them. */
export function seamPieces({ first, second }: SeamRow, draft: Draft): string {
  const titles = [first, second].map(
    ({ piece }) => draft.pieces.find((each) => each.name === piece)?.title ?? piece,
  );
  return [...new Set(titles)].join(' – ');
}

/** Place of the seam an edge belongs to among the seams walked; -1 where the edge is sewn to no other. */
export const seamIndex = (draft: Draft, edge: EdgeRef | undefined): number =>
  edge === undefined
    ? -1
    : draft.proof.seams.findIndex(({ first, second }) => same(first, edge) || same(second, edge));

/** The seam an edge belongs to with both lengths; an edge sewn to no other has none. */
export function litSeam(draft: Draft, edge: EdgeRef | undefined, unit: Unit): LitSeam | undefined {
  const row = draft.proof.seams[seamIndex(draft, edge)];
  if (row === undefined) return undefined;
  const titleOf = (name: string) => draft.pieces.find((each) => each.name === name)?.title ?? name;
  const alone = same(row.first, row.second);
  return {
    title: seamWord(row),
    edges: [row.first, row.second],
    lines: (alone ? [row.first] : [row.first, row.second]).map(
      (each) => `${titleOf(each.piece)}: ${formatLength(each.length, unit)}`,
    ),
  };
}
