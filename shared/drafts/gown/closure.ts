import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { Opening } from '../../drafting/construction.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import type { Piece } from '../../drafting/piece.ts';
import { xAt } from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { type Gaps, laceBack } from './lacing.ts';
import type { PairedHalves } from './pair-halves.ts';
import { type GownStyle, isOffShoulder } from './style-card.ts';
import { zipCentreBack, zipSide } from './zips.ts';

/** A closure ends this far above the hip at the highest. */
const aboveHip = 20;
/** A zip is bought longer than its opening by this (reference.md 3h, common practice), to the next whole centimetre. */
const longer = 25;
/** Part of its stretch that a cloth may be pulled by as the gown goes over the hips: half of it (common practice). */
const givePart = 0.5;

/** How far a cloth may be stretched for a moment, as a part of its length. */
const giveOf = ({ cloth, stretch }: Pick<GownStyle, 'cloth' | 'stretch'>): number =>
  cloth === 'stretch' ? (givePart * stretch) / 100 : 0;

/** What a closure is made from. */
type ClosureInputs = {
  readonly body: Body;
  readonly levels: BodyLevels;
  readonly pair: PairedHalves;
  readonly style: GownStyle;
};

/** The gown with its closure: pieces, what the proof has to know, and what lacing leaves open. */
export type ClosedGown = {
  readonly pieces: readonly Piece[];
  readonly opening: Opening;
  readonly gaps?: Gaps;
};

/** The highest place from 20 above the hip down at which the closed gown still passes the hips. */
function endOfOpening({ body, levels, pair, style }: ClosureInputs): number {
  const { front, back } = pair;
  const wide = (up: number): number =>
    2 * (xAt(front.line, front.heights.hip - up) + xAt(back.line, back.heights.hip - up));
  for (let up = aboveHip; up > 0; up -= 1) {
    if (wide(up) * (1 + giveOf(style)) >= body.measures.hipGirth) return levels.hip - up;
  }
  return levels.hip;
}

/** A zip as it is bought, mm. */
const bought = (length: number): number => Math.ceil((length + longer) / 10) * 10;

function openingOf({ body, style }: ClosureInputs): Opening {
  const { hipGirth, shoulderGirth } = body.measures;
  return {
    closure: style.closure,
    hips: hipGirth,
    least: Math.min(hipGirth, shoulderGirth),
    give: giveOf(style),
    ...(style.closure === 'sideZip' && isOffShoulder(style)
      ? { closedTop: shoulderGirth + style.armEase }
      : {}),
  };
}

/** Puts the closure of the style card into the pieces and says what to buy for it. */
export function closeGown(
  table: DraftingTable,
  pieces: readonly Piece[],
  inputs: ClosureInputs,
): ClosedGown {
  const { levels, style } = inputs;
  const paper = table.part('Closure', 'both');
  const end = endOfOpening(inputs);
  const opening = openingOf(inputs);
  const ends = said`ends ${mm(end - levels.waist)} below the waist, ${levels.hip - end < 0.5 ? 'at the hip' : said`${mm(levels.hip - end)} above the hip`}`;
  const why = said`The gown is stepped into: what stays closed below has to pass the hips.`;
  if (style.closure === 'laced') {
    const { pieces: laced, length, gap, gaps, eyelets } = laceBack(pieces, levels.waist, end);
    paper.draw(
      'Lacing',
      said`The centre back edges stand ${mm(gap)} apart from the top edge to the waist and meet where the lacing ${ends}. Each edge is ${mm(length)} long and has ${String(eyelets)} eyelets about ${mm(25)} apart, ${mm(15)} from the edge, with a bone on either side of them; or sew loops ${mm(12)} to ${mm(15)} apart along it. A panel of its own lies behind.`,
      {
        why: said`The gap is counted in every girth, so that the gown fits laced as it is drawn and can be let out or drawn in. Lacing must allow a full breath: loosen it at once on numbness or faintness. The cords go over each other as many times as there are eyelets: about ${mm(length * 8)} of cord.`,
        pieces: ['modesty-panel'],
      },
    );
    return { pieces: laced, opening, gaps };
  }
  if (style.closure === 'sideZip') {
    const { pieces: zipped, length, fold } = zipSide(pieces, end);
    const centre = fold
      ? 'The centre back runs straight, so nothing is gained by a seam there: it is cut on the fold.'
      : 'The centre back runs outwards below the knee line, so it stays a seam.';
    paper.draw(
      'Side zip',
      said`In the left side seam from its upper end down, ${mm(length)} along the seam; it ${ends}. Buy a zip of ${mm(bought(length))}. ${centre}`,
      {
        why: said`${why} Both side seams are cut with the zip's allowance, so that the pieces need not be told apart; leave the left one open above its mark.`,
      },
    );
    return { pieces: zipped, opening };
  }
  const { pieces: zipped, length } = zipCentreBack(pieces, end);
  paper.draw(
    'Zip',
    said`In the centre back from the top edge down, ${mm(length)} long; it ${ends}. Buy a zip of ${mm(bought(length))}.`,
    {
      why: said`${why} The extension for the zip is an allowance and in no girth. Stop the zip ${mm(5)} below the edge and sew a hook above it.`,
    },
  );
  return { pieces: zipped, opening };
}
