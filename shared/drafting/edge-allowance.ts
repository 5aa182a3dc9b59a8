import { pathLength } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { turnsAlong } from '../geometry/turns.ts';
import { type AllowanceKind, type HouseRules, allowanceFor } from './house-rules.ts';
import type { Edge, Piece } from './piece.ts';

/**
 * A hem that bends no more tightly than this is turned up like a straight one: its edge is then at most
 * three hundredths longer than where it is sewn, which can be eased in (common practice, no source).
 */
const straightFrom = 1330;

function bendsLittle(path: Path): boolean {
  const turned = turnsAlong(path).reduce((sum, { degrees }) => sum + Math.abs(degrees), 0);
  return pathLength(path) >= (straightFrom * turned * Math.PI) / 180;
}

/** Which of the house's allowances an edge takes; none at a fold or across the mouth of a dart. */
export function allowanceKind({ kind, name, path, open, narrow }: Edge): AllowanceKind | undefined {
  if (kind === 'fold' || kind === 'mouth' || open === true) return undefined;
  if (kind === 'hem') return narrow !== true && bendsLittle(path) ? 'straightHem' : 'hem';
  if (kind !== 'seam') return kind;
  if (/^waist\b/.test(name)) return 'waist';
  return /princess/.test(name) ? 'princess' : 'seam';
}

/** Cloth beyond the seam line of an edge by the house's rules, mm; no answer where it has none of its own. */
export function edgeAllowance(edge: Edge, rules: HouseRules): number | undefined {
  const kind = allowanceKind(edge);
  return kind === undefined ? undefined : allowanceFor(kind, rules);
}

/** Each allowance as a maker calls the edges it lies outside of, in the order they are told. */
const allowanceWords: readonly (readonly [AllowanceKind, string])[] = [
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

/** The allowances these pieces have, by name, mm. */
export function allowancesOf(
  pieces: readonly Piece[],
  rules: HouseRules,
): readonly { readonly name: string; readonly wide: number }[] {
  const used = new Set(pieces.flatMap((piece) => piece.edges.map(allowanceKind)));
  return allowanceWords
    .filter(([kind]) => used.has(kind))
    .map(([kind, name]) => ({ name, wide: allowanceFor(kind, rules) }));
}
