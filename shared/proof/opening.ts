import type { Construction } from '../drafting/construction.ts';
import type { LevelLine, Notch, Piece } from '../drafting/piece.ts';
import type { Point } from '../geometry/point.ts';
import { type Said, fine, mm, said } from '../units/said.ts';
import { atLeast, missing, proofLine } from './finding.ts';
import { levelGirth, widthAtLevel } from './girths.ts';
import type { Finding, ProofLine } from './proof.ts';

const bound = 0.5;

/** Names of the notches at which a zip or a lacing ends. */
const ends = ['zip-end', 'lace-end'];

type End = { readonly piece: Piece; readonly notch: Notch };

/** Where the opening ends on each side of the body that has a mark for it. */
const endsOn = (pieces: readonly Piece[]): readonly End[] =>
  pieces
    .filter(({ part }) => part !== 'inner')
    .flatMap((piece) =>
      piece.notches.filter(({ name }) => ends.includes(name)).map((notch) => ({ piece, notch })),
    );

const hipOf = (piece: Piece): LevelLine | undefined =>
  piece.levels.find(({ level }) => level === 'hip');

/** How far a mark lies below the hip level of its piece, mm; less than nothing above it. */
function belowHip({ piece, notch: { at } }: End): number | undefined {
  const hip = hipOf(piece);
  if (!hip) return undefined;
  const share = (at.x - hip.from.x) / (hip.to.x - hip.from.x);
  return at.y - hip.from.y - share * (hip.to.y - hip.from.y);
}

/** Girth of the closed gown just under the opening, mm, as far from the hip level as its mark is. */
function girthAtEnd(pieces: readonly Piece[], marks: readonly End[]): number | undefined {
  let half = 0;
  for (const side of ['front', 'back'] as const) {
    const mark = marks.find(({ piece }) => piece.side === side) ?? marks[0];
    const by = mark && belowHip(mark);
    if (by === undefined) return undefined;
    for (const piece of pieces.filter((each) => each.side === side && each.part !== 'inner')) {
      const hip = hipOf(piece);
      if (!hip) continue;
      const shifted = ({ x, y }: Point): Point => ({ x, y: y + by });
      const width = widthAtLevel(piece, { ...hip, from: shifted(hip.from), to: shifted(hip.to) });
      if (width === undefined) return undefined;
      half += width;
    }
  }
  return half === 0 ? undefined : 2 * half;
}

const closureWords = { centreBackZip: 'zip', sideZip: 'side zip', laced: 'lacing' } as const;

/** The gown is stepped into: what stays closed under the opening has to pass the hips. */
function passesHips(pieces: readonly Piece[], { opening }: Construction): Finding {
  const marks = endsOn(pieces);
  const where = marks.map(({ piece, notch }) => ({
    piece: piece.name,
    edge: notch.edge,
    at: notch.at,
  }));
  const name = closureWords[opening.closure];
  const girth = girthAtEnd(pieces, marks);
  if (girth === undefined) return missing([`The end of the ${name} is not marked.`], where);
  const open = girth * (1 + opening.give);
  const stretched: Said = opening.give === 0 ? [] : said`, stretched ${fine(open)}`;
  return atLeast(
    open,
    opening.hips,
    bound,
    said`Where the ${name} ends the gown measures ${fine(girth)}${stretched}; stepping in, it must pass the hips, ${mm(opening.hips)}.`,
    where,
  );
}

/** A top edge that stays closed all round, as with a side zip under a band round both arms, passes the hips too. */
function closedEdge({ opening }: Construction): readonly Finding[] {
  const { closedTop } = opening;
  if (closedTop === undefined) return [];
  const open = closedTop * (1 + opening.give);
  return [
    atLeast(
      open,
      opening.least,
      bound,
      said`The upper edge with its bands stays closed all round and measures ${fine(open)}; it must pass ${mm(opening.least)}, the hips from below or the shoulders from above.`,
      [],
    ),
  ];
}

/** The knee seam has to reach round both knees; the step it allows is said, and a caution where it is short. */
function walkedIn(pieces: readonly Piece[], { knees }: Construction): Finding {
  const { girth, where } = levelGirth(pieces, 'knee-seam');
  if (girth === undefined) return missing(['The knee seam is not found on the pieces.'], where);
  const caution = knees.caution
    ? ' Caution: stairs, kerbs and getting into a car need care; try it at the fitting.'
    : '';
  return atLeast(
    girth,
    knees.standing,
    bound,
    said`At the knee seam the gown measures ${fine(girth)}; both knees standing need ${mm(knees.standing)}. It allows a step of about ${mm(knees.step)}.${caution}`,
    where,
  );
}

/**
 * Proof line 7: the garment can be put on and walked in. The opening is looked for on the pieces, and the
 * girth where it ends measured there.
 */
export const proveOpening = (pieces: readonly Piece[], construction: Construction): ProofLine =>
  proofLine(7, 'It can be put on and walked in', [
    passesHips(pieces, construction),
    ...closedEdge(construction),
    walkedIn(pieces, construction),
  ]);
