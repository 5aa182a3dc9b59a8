import { edgeAllowance } from '../drafting/edge-allowance.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { Edge } from '../drafting/piece.ts';

/**
 * Cloth beyond the seam line of an edge, mm: none at a fold. The mouth of a dart has none of its
 * own: its cap follows the edges beside it (`dart-cap.ts`).
 */
export const allowanceOf = (edge: Edge, rules: HouseRules): number =>
  edgeAllowance(edge, rules) ?? 0;

/** First words of the names of seams that run round the body and are sewn after the long ones. */
const roundTheBody = /^(waist|knee|hem|top|neck)\b/;

/**
 * Whether an edge is a long seam, sewn and pressed open before the seams that run round the body
 * are sewn across its ends (common practice, no source).
 */
export function pressedOpen(edge: Edge): boolean {
  if (edge.kind === 'side' || edge.kind === 'zip') return true;
  return edge.kind === 'seam' && !roundTheBody.test(edge.name);
}
