import type { DraftingTable } from '../drafting/drafting-table.ts';
import { allowanceKind } from '../drafting/edge-allowance.ts';
import { type AllowanceKind, type HouseRules, allowanceFor } from '../drafting/house-rules.ts';
import type { Piece } from '../drafting/piece.ts';
import { type Said, mm, said } from '../units/said.ts';

const words: readonly (readonly [AllowanceKind, string])[] = [
  ['seam', 'seams'],
  ['side', 'side seams'],
  ['waist', 'waist seam'],
  ['princess', 'princess seams'],
  ['zip', 'the seam with the closure'],
  ['top', 'enclosed edges'],
  ['armhole', 'armhole edges'],
  ['facing', 'free edges of facings'],
  ['hem', 'circular hem'],
  ['straightHem', 'straight hem'],
];

/** Says what was added outside the seam lines of these pieces, and why only now. */
export function narrateFinishing(
  table: DraftingTable,
  pieces: readonly Piece[],
  rules: HouseRules,
  why: Said,
): void {
  const used = new Set(pieces.flatMap((piece) => piece.edges.map(allowanceKind)));
  const allowances = words
    .filter(([kind]) => used.has(kind))
    .map(([kind, name]) => said`${name} ${mm(allowanceFor(kind, rules))}`);
  const list = allowances.flatMap((each, k) => (k === 0 ? each : said`, ${each}`));
  table
    .part('Finishing', 'both')
    .draw('Allowances', said`Added outside the seam line, last of all: ${list}; a fold has none.`, {
      why,
    });
}
