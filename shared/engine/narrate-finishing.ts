import type { DraftingTable } from '../drafting/drafting-table.ts';
import { allowancesOf } from '../drafting/edge-allowance.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { Piece } from '../drafting/piece.ts';
import { type Said, mm, said } from '../units/said.ts';

/** Says what was added outside the seam lines of these pieces, and why only now. */
export function narrateFinishing(
  table: DraftingTable,
  pieces: readonly Piece[],
  rules: HouseRules,
  why: Said,
): void {
  const allowances = allowancesOf(pieces, rules).map(({ name, wide }) => said`${name} ${mm(wide)}`);
  const list = allowances.flatMap((each, k) => (k === 0 ? each : said`, ${each}`));
  table
    .part('Finishing', 'both')
    .draw('Allowances', said`Added outside the seam line, last of all: ${list}; a fold has none.`, {
      why,
    });
}
