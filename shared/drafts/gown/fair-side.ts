import {
  type Knot,
  type Profile,
  clampedSpline,
  cubicProfile,
  profilePath,
  xAt,
} from '../../geometry/profile.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import { seenBend } from '../../drafting/fair-bends.ts';
import { bendChanges, turnsAlong } from '../../geometry/turns.ts';
import { said } from '../../units/said.ts';
import type { Half } from './half.ts';
import type { SideLeans } from './side-line.ts';

/** Leans that are tried at bust and hip, dx/dy: up to 17 degrees either way, together the least first [our rule]. */
const leans = Array.from({ length: 11 }, (_, k) => 0.06 * (k - 5));
const pairs: readonly Required<SideLeans>[] = leans
  .flatMap((bust) => leans.map((hip) => ({ bust, hip })))
  .toSorted((a, b) => Math.abs(a.bust) + Math.abs(a.hip) - Math.abs(b.bust) - Math.abs(b.hip))
  .slice(1);

const changesOf = (line: Profile, { heights }: Half): number =>
  bendChanges(turnsAlong(profilePath(line, heights.underarm, heights.knee)), seenBend).length;

/** Whether the side seam of a half changes its bend at most so often. */
export const isFair = (half: Half, most: number): boolean => changesOf(half.line, half) <= most;

/** The side seam of a half with other leans at bust and hip, through the same widths. */
function leaning({ line, heights }: Half, leans: Required<SideLeans>): Profile {
  const { underarm, bust, hip, knee } = heights;
  const at = (y: number): Knot => ({ y, x: xAt(line, y) });
  const between = line.filter(({ from, to }) => from > bust - 1e-6 && to < hip + 1e-6);
  const [top, foot] = [at(underarm), at(bust)];
  const mean = (foot.x - top.x) / (foot.y - top.y);
  return [
    ...cubicProfile(top, foot, 2 * mean - leans.bust, leans.bust),
    ...clampedSpline([foot, ...between.map(({ to }) => at(to))], leans.bust, leans.hip),
    ...cubicProfile(at(hip), at(knee), leans.hip, 0),
  ];
}

/**
 * The leans at bust and hip with which a side seam bends at most so often; nothing where upright it
 * does already. A body that goes on widening, or narrowing, past its bust or hip has no reason to be
 * upright there, and a seam that stands upright all the same makes a step.
 */
export function fairSide(half: Half, most: number): SideLeans | undefined {
  let fewest = changesOf(half.line, half);
  let best: SideLeans | undefined;
  for (const tried of pairs) {
    if (fewest <= most) break;
    const changes = changesOf(leaning(half, tried), half);
    if (changes >= fewest) continue;
    fewest = changes;
    best = tried;
  }
  return best;
}

/** Tells the maker where the side seams took another share of the suppression than the house's. */
export function warnOfShare(table: DraftingTable, used: number, own: number): void {
  if (used === own) return;
  const per = (share: number): string => `${String(Math.round(share * 100))} %`;
  table.warn({
    code: 'side-share-moved',
    severity: 'warning',
    field: 'rules.sideShare',
    with: ['card.waistGirth', 'card.hipGirth'],
    said: said`With ${per(own)} of the suppression these side seams would bend too often or leave no cloth beside the darts, so they take ${per(used)}. Look at them in the toile.`,
  });
}
