import type { FinishedPiece } from '../drafting/piece.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { Path } from '../geometry/path.ts';
import { distance } from '../geometry/point.ts';
import { type Said, fine } from '../units/said.ts';
import { worstCaps } from './caps.ts';
import { clearBound, worstClearances } from './clearance.ts';
import { areaInside, crossesItself } from './crossing-itself.ts';
import { finding, proofLine } from './finding.ts';
import { spoken } from './joined-edges.ts';
import type { Finding, ProofLine } from './proof.ts';

const closedBound = 0.001;

/** Widest gap between the end of one stretch and the start of the next, all the way round. */
function widestGap(outline: Path): number {
  let widest = outline.length === 0 ? Infinity : 0;
  outline.forEach((segment, index) => {
    const next = outline[(index + 1) % outline.length];
    if (next) widest = Math.max(widest, distance(segment.to, next.from));
  });
  return widest;
}

function outlineFindings(piece: FinishedPiece, which: string, outline: Path): readonly Finding[] {
  const where = [{ piece: piece.name }];
  const gap = widestGap(outline);
  const title = `${piece.title}, ${which}`;
  if (!(gap <= closedBound)) {
    const open = Number.isFinite(gap) ? gap : 1;
    const said: Said = [`${title}: is not closed, a gap of `, fine(open), ' is left.'];
    return [finding(open, 0, closedBound, said, where)];
  }
  const crossed = crossesItself(outline);
  const area = areaInside(outline);
  return [
    finding(
      crossed ? 1 : 0,
      0,
      0,
      [crossed ? `${title}: crosses itself.` : `${title}: closed, never crosses itself.`],
      crossed ? [{ piece: piece.name, at: crossed }] : where,
    ),
    finding(
      Math.sign(area),
      1,
      0,
      [area > 0 ? `${title}: runs the right way round.` : `${title}: runs the wrong way round.`],
      where,
    ),
  ];
}

function clearanceFindings(piece: FinishedPiece, rules: HouseRules): readonly Finding[] {
  return [...worstClearances(piece, rules), ...worstCaps(piece, rules)].map(
    ({ edge, wanted, found, at }) =>
      finding(
        found,
        wanted,
        clearBound,
        [
          `${piece.title}, ${spoken(edge.name)}: the cutting line lies `,
          fine(found),
          ' outside the seam line, ',
          fine(wanted),
          ' asked.',
        ],
        [{ piece: piece.name, edge: edge.name, at }],
      ),
  );
}

/** Proof line 5: outlines closed, simple and clockwise; cutting lines clear by their allowance. */
export const proveOutlines = (pieces: readonly FinishedPiece[], rules: HouseRules): ProofLine =>
  proofLine(
    5,
    'Outlines are sound, cutting lines stand off by their allowance',
    pieces.flatMap((piece) => [
      ...outlineFindings(
        piece,
        'seam line',
        piece.edges.flatMap((edge) => edge.path),
      ),
      ...outlineFindings(piece, 'cutting line', piece.cutLine),
      ...clearanceFindings(piece, rules),
    ]),
  );
