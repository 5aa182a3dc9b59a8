import type { Body } from '../../body/card.ts';
import { DraftingError } from '../../drafting/drafting-error.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import { edge, notchAtLength, to } from '../../drafting/outline.ts';
import type { Edge, Piece, Side } from '../../drafting/piece.ts';
import { type Quantity, taken } from '../../drafting/quantity.ts';
import { pathLength, splitPath, stationAtLength } from '../../geometry/curve.ts';
import type { Problem } from '../../units/problem.ts';
import { mm, said } from '../../units/said.ts';
import { type BandPlan, planBand, shapeBand } from './band.ts';
import {
  type BandPartners,
  narratePlain,
  narratePleated,
  plainBand,
  pleatedBand,
  setInEdge,
} from './band-pieces.ts';
import type { GownStyle } from './style-card.ts';

/** The finished edges of a half that a band is planned from. */
export type TopEdges = { readonly topEdge: number; readonly armhole: number };

/** A ring longer than the tape by more than this, mm, lies too loose to stay on the arms (our rule): it is refused. */
const loosest = 450;

/** The pieces of a gown off the shoulder with its bands set in. */
export function setInBands(
  table: DraftingTable,
  body: Body,
  style: GownStyle,
  edges: { readonly [S in Side]: TopEdges },
  pieces: readonly Piece[],
): readonly Piece[] {
  const { shoulderGirth, upperArmGirth: arm } = body.measures;
  const plan = planBand({
    girth: shoulderGirth + style.armEase,
    arm,
    frontTop: edges.front.topEdge,
    backTop: edges.back.topEdge,
    frontArmhole: edges.front.armhole,
    backArmhole: edges.back.armhole,
    height: style.bandHeight,
    pleated: style.sleeve === 'pleatedBand',
  });
  if (looseBy(plan) > loosest) throw tooLoose(style, plan);
  const paper = table.part('Sleeve', 'both');
  narratePath(table, body, style, edges, plan);
  const partners: BandPartners = {
    front: holderOf(pieces, 'front'),
    back: holderOf(pieces, 'back'),
  };
  const upperArm = taken('Upper arm', 'upperArmGirth', arm, 'upperArmGirth' in body.estimated);
  const own = bandPieces(paper, style, plan, partners, upperArm);
  if (looseBy(plan) > 0) table.warn(looseRing(style, plan, 'warning'));
  if (style.sleeve === 'pleatedBand') warnOfTightFold(table, style, plan, arm);
  return [
    ...pieces.map((piece) =>
      piece.name === partners.front || piece.name === partners.back
        ? receiving(piece, plan.setIn[piece.side])
        : piece,
    ),
    ...own,
  ];
}

function bandPieces(
  paper: ReturnType<DraftingTable['part']>,
  style: GownStyle,
  plan: BandPlan,
  partners: BandPartners,
  arm: Quantity,
): readonly Piece[] {
  if (style.sleeve === 'pleatedBand') {
    const pieces = pleatedBand(plan, style.pleatRatio, partners);
    narratePleated(paper, plan, style.pleatRatio, pieces);
    return pieces;
  }
  const shape = shapeBand(plan);
  if (!shape) throw tooFull(style, plan);
  const pieces = plainBand(shape, partners);
  narratePlain(paper, plan, shape, arm, pieces);
  return pieces;
}

const holderOf = (pieces: readonly Piece[], side: Side): string =>
  pieces.find((piece) => piece.side === side && piece.edges.some(({ name }) => name === 'armhole'))
    ?.name ?? '';

/** The piece with its armhole edge parted where the band ends, and both set-in points marked. */
function receiving(piece: Piece, setIn: number): Piece {
  const strokes = piece.side === 'front' ? 1 : 2;
  const marks: Piece['notches'][number][] = [];
  const edges = piece.edges.flatMap((each): readonly Edge[] => {
    if (each.name !== 'armhole') return [each];
    const sewn = (path: Edge['path']): Edge =>
      edge(setInEdge, 'armhole', path, to('sleeve-band', piece.side));
    const mark = (own: Edge): Edge => {
      marks.push(...notchAtLength('band', own, pathLength(own.path) / 2, strokes));
      return own;
    };
    const station = stationAtLength(each.path, setIn);
    if (!station || pathLength(each.path) - setIn < 1) return [mark(sewn(each.path))];
    const [above, below] = splitPath(each.path, station);
    const free: Edge = { ...edge('armhole', 'armhole', below), corner: 180 };
    marks.push(...notchAtLength('set-in', free, 0, strokes));
    return [mark(sewn(above)), free];
  });
  return { ...piece, edges, notches: [...piece.notches, ...marks] };
}

function narratePath(
  table: DraftingTable,
  body: Body,
  style: GownStyle,
  { front, back }: { readonly [S in Side]: TopEdges },
  plan: BandPlan,
): void {
  const { shoulderGirth } = body.measures;
  const estimated = 'shoulderGirth' in body.estimated ? ' (estimated)' : '';
  const eased =
    Math.abs(style.armEase) < 0.5
      ? said``
      : said` ${style.armEase < 0 ? '−' : '+'} ease ${mm(Math.abs(style.armEase))}`;
  const outside =
    looseBy(plan) > 0
      ? said`, less than its outside: ${mm(plan.path)} is taken, two fifths of the upper arm`
      : said``;
  table
    .part('Sleeve', 'both')
    .draw(
      'Arm path',
      said`Half of (shoulder girth ${mm(shoulderGirth, ['shoulderGirth'])}${estimated}${eased}) less the finished top edges, front ${mm(front.topEdge)} and back ${mm(back.topEdge)}, leaves ${mm(plan.left)} over each arm${outside}.`,
      {
        why: said`Top edges and bands make one ring round chest, back and both arms: it is as long as the tape was.`,
        measures: ['shoulderGirth'],
      },
    );
}

/** A pleated band's fold may be tighter than the arm it goes over: said, for the pleat ratio mends it. */
function warnOfTightFold(
  table: DraftingTable,
  style: GownStyle,
  plan: BandPlan,
  arm: number,
): void {
  const round = plan.path * style.pleatRatio + plan.free.front + plan.free.back;
  if (round >= arm) return;
  table.warn({
    code: 'band-tight',
    severity: 'warning',
    field: 'style.pleatRatio',
    with: ['style.armEase', 'card.upperArmGirth', 'card.shoulderGirth'],
    said: said`The lower edge of the band opens to ${mm(round)} round an arm of ${mm(arm)}: pleat more into it, give it more ease, or measure both again.`,
  });
}

/** By how much top edges and bands together are longer than the tape and its ease, mm. */
const looseBy = ({ path, left }: BandPlan): number => 2 * (path - left);

const looseRing = (style: GownStyle, plan: BandPlan, severity: Problem['severity']): Problem => ({
  code: 'band-loose',
  severity,
  field: 'style.sleeve',
  with: [
    'style.neckDepth',
    'style.sideDepth',
    'card.shoulderGirth',
    'card.acrossFront',
    'card.acrossBack',
  ],
  said: said`Top edges and bands together are ${mm(looseBy(plan))} longer than the shoulder girth with ${mm(style.armEase)} of ease, and may slip off the arms${severity === 'error' ? said`; ${mm(loosest)} at most can be held` : said``}: raise the neck or the side, measure round both arms again, or leave the sleeve out.`,
});

const tooLoose = (style: GownStyle, plan: BandPlan): DraftingError =>
  new DraftingError([looseRing(style, plan, 'error')]);

const tooFull = (style: GownStyle, { path, lower }: BandPlan): DraftingError =>
  new DraftingError([
    {
      code: 'band-too-full',
      severity: 'error',
      field: 'style.bandHeight',
      with: ['style.sleeve', 'card.upperArmGirth', 'card.shoulderGirth'],
      said: said`A plain band ${mm(style.bandHeight)} high cannot widen from ${mm(path)} over the shoulder to ${mm(lower)} round the arm: make it higher, or choose the pleated band.`,
    },
  ]);
