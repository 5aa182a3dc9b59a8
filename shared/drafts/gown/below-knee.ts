import type { DraftingTable, PartTable } from '../../drafting/drafting-table.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import { leastSaid } from '../../drafting/quantity.ts';
import type { Piece, Side } from '../../drafting/piece.ts';
import { pathLength } from '../../geometry/curve.ts';
import { deg, mm, said } from '../../units/said.ts';
import { flarePieces } from './flare.ts';
import { flareHem, flareRadius, hemPath, partOfCircle, planFlare } from './flare-plan.ts';
import { godetPieces, narrateGodets } from './godet-pieces.ts';
import {
  type GodetPlan,
  godetAngle,
  godetCount,
  godetFoot,
  godetPlaces,
  sumOfRadii,
} from './godets.ts';
import { integralFoot, planIntegral } from './integral.ts';
import { kneeStretches } from './knee-stretches.ts';
import { type FootOf, type PanelFoot, kneeFoot } from './skirt-foot.ts';
import { type SkirtPanel, princessToTheKnee } from './skirt-panel.ts';
import type { GownStyle } from './style-card.ts';

/** What lies at and below the knee line of a gown. */
export type BelowKnee = {
  /** How each panel of the skirt ends. */
  readonly footOf: FootOf;
  /** Draws the pieces of one side that are sewn on below. */
  readonly pieces: (side: Side) => readonly Piece[];
  /** Length of the hem all round, mm: what was asked for, and what a train adds to it. */
  readonly hem: number;
};

/** What it is drawn from. */
export type BelowKneeInputs = {
  readonly style: GownStyle;
  readonly rules: HouseRules;
  readonly panels: { readonly [S in Side]: readonly SkirtPanel[] };
};

/** Usable width of cloth between the seam lines of a piece with seams on both sides. */
export const roomOf = ({ clothWidth }: Pick<GownStyle, 'clothWidth'>, rules: HouseRules): number =>
  clothWidth - 2 * Math.max(rules.allowance.seam, rules.allowance.side);

/** The feet of all panels, by the names of their pieces. */
function feetOf(
  { front, back }: BelowKneeInputs['panels'],
  draw: (panel: SkirtPanel) => PanelFoot,
): FootOf {
  const feet = new Map([...front, ...back].map((panel) => [panel.piece, draw(panel)]));
  return (piece) => {
    const foot = feet.get(piece);
    if (!foot) throw new Error(`no panel of the skirt is called ${piece}`);
    return foot;
  };
}

/** Draws what lies below the knee line, by the style's kind of flare. */
export function belowKnee(table: DraftingTable, inputs: BelowKneeInputs): BelowKnee {
  const paper = table.part('Flare', 'flare');
  switch (inputs.style.flare) {
    case 'circle':
    case 'aLine':
      return sectors(paper, inputs);
    case 'godets':
      return godets(paper, inputs);
    case 'integral':
      return integral(paper, inputs);
  }
}

/** A seam at the knee and a part of a circle sewn to it. */
function sectors(paper: PartTable, { style, rules, panels }: BelowKneeInputs): BelowKnee {
  const { kneeFinished: knee, flareLength: depth, train } = style;
  const circle = style.flare === 'circle';
  const fraction = circle ? style.flareFraction : partOfCircle(knee, style.hemSweep, depth);
  const inner = flareRadius(knee, fraction);
  const planOf = (side: Side) =>
    planFlare({
      seam: Math.max(...panels[side].map(({ until }) => until)),
      inner,
      depth,
      room: roomOf(style, rules),
      train: side === 'back' ? train : 0,
      least: rules.counts?.gores?.[side],
    });
  const plans = { front: planOf('front'), back: planOf('back') };
  const stretches = {
    front: kneeStretches(plans.front, panels.front),
    back: kneeStretches(plans.back, panels.back),
  };
  const sweep = flareHem(knee, fraction, depth);
  const trained = pathLength(hemPath(plans.back, 0, plans.back.angle, 0));
  const hem = sweep + (train === 0 ? 0 : 2 * (trained - plans.back.outer * plans.back.angle));
  return {
    hem,
    footOf: feetOf(panels, (panel) => kneeFoot(panel, stretches[panel.side])),
    pieces: (side) => {
      if (side === 'front') {
        paper.draw(
          'Flare radius',
          circle
            ? said`Knee seam ${mm(knee)} over 2π times ${Number(fraction.toPrecision(3))} of a circle gives the inner radius ${mm(inner)}; ${mm(depth)} deep, its hem is ${mm(sweep)} all round, ${fullness(sweep, knee)} times the knee seam.`
            : said`A hem of ${mm(sweep)} asked for, ${mm(sweep - knee)} more than the knee seam over ${mm(depth)} of depth: inner radius ${mm(knee)} × ${mm(depth)} / ${mm(sweep - knee)} = ${mm(inner)}. The hem is ${fullness(sweep, knee)} times the knee seam.`,
          {
            why: said`The seam line keeps this radius; allowances are added outside it. Let the flare hang a day or two before the hem is levelled from the floor, for its bias drops.`,
          },
        );
        narrateTrain(paper, style, hem);
      }
      const other = side === 'front' ? 'back' : 'front';
      return flarePieces(paper, side, plans[side], plans[other].gores, stretches[side]);
    },
  };
}

/** How full a hem is, to a tenth. */
const fullness = (sweep: number, knee: number): string => (sweep / knee).toFixed(1);

function narrateTrain(paper: PartTable, { train }: GownStyle, hem: number): void {
  if (train < leastSaid) return;
  paper.draw(
    'Train',
    said`The hem at the centre back is ${mm(train)} longer than the level hem, growing from nothing at the side seams; the front stays level. With it the hem is ${mm(hem)} all round.`,
    {
      why: said`A train catches on stairs, doors and other people's feet: sew a wrist loop, or a button and loop that hold it up, and have her walk with both before the day.`,
    },
  );
}

/** Length of the hems of all panels all round. */
const hemOf = ({ front, back }: BelowKneeInputs['panels'], footOf: FootOf): number =>
  2 *
  [...front, ...back]
    .flatMap(({ piece }) => footOf(piece).edges.filter(({ kind }) => kind === 'hem'))
    .reduce((sum, { path }) => sum + pathLength(path), 0);

/** No seam at the knee: the skirt runs on upright, with sectors set into its seams. */
function godets(paper: PartTable, { style, rules, panels }: BelowKneeInputs): BelowKnee {
  const { hemSweep: sweep, kneeFinished: knee, flareLength: depth, train } = style;
  const places = godetPlaces(princessToTheKnee(style), train);
  const plan: GodetPlan = {
    depth,
    train,
    places,
    angle: godetAngle(sweep - knee, godetCount(places), depth),
    room: roomOf(style, rules),
    panels: [...panels.front, ...panels.back],
  };
  const drawn = godetPieces(plan);
  const footOf = feetOf(panels, (panel) => godetFoot(plan, panel));
  const hem = train === 0 ? sweep : hemOf(panels, footOf) + plan.angle * sumOfRadii(plan);
  return {
    hem,
    footOf,
    pieces: (side) => {
      if (side === 'back') {
        narrateGodets(paper, plan, sweep, sweep - knee, drawn);
        narrateTrain(paper, style, hem);
      }
      return drawn.filter((piece) => piece.side === side);
    },
  };
}

/** No seam at the knee: the seams of the skirt themselves run on outwards. */
function integral(paper: PartTable, { style, panels }: BelowKneeInputs): BelowKnee {
  const { hemSweep: sweep, kneeFinished: knee, flareLength: depth, train } = style;
  const both = [...panels.front, ...panels.back];
  const plan = planIntegral(both, { depth, train, hemSweep: sweep });
  const footOf = feetOf(panels, (panel) => integralFoot(plan, panel));
  const hem = train === 0 ? sweep : hemOf(panels, footOf);
  return {
    hem,
    footOf,
    pieces: (side) => {
      if (side === 'back') {
        const [first] = both;
        const run = first ? footOf(first.piece).outer : [];
        const end = run.at(-1)?.to;
        const raised = first && end ? first.knee + depth - end.y : 0;
        paper.draw(
          'Seams run on',
          said`Below the knee line every seam but the centre front turns outwards, upright at first, then straight, ${deg((Math.atan(plan.lean) * 180) / Math.PI)} off upright, until the hem is ${mm(sweep)} all round, ${fullness(sweep, knee)} times the knee. Each is ${mm(pathLength(run))} long below the knee, as long as the skirt is deep there, ${raised < leastSaid ? said`so its end lies as low as the middle of the hem, which it meets squarely` : said`so its end lies ${mm(raised)} higher than the level middle of the hem; the hem curves up to meet it squarely`}.`,
          {
            why: said`A slanting seam is longer than an upright one of the same height: cut to one length, all of them end the same way over the floor.`,
          },
        );
        narrateTrain(paper, style, hem);
      }
      return [];
    },
  };
}
