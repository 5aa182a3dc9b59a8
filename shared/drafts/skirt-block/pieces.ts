import { edge, levelLine, notchAtHeight, notchAtLength, to } from '../../drafting/outline.ts';
import { onDartAxis } from '../../drafting/dart-axis.ts';
import type { Piece } from '../../drafting/piece.ts';
import { pathLength } from '../../geometry/curve.ts';
import { type Path, line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { profilePath, xAt } from '../../geometry/profile.ts';
import { waistDarts, waistEdges } from '../waist-edges.ts';
import type { QuarterPlan, SkirtHeights } from './plan-quarters.ts';

/** Names of the two pieces. */
export const nameOf = { front: 'skirt-front', back: 'skirt-back' } as const;
/** Darts are drilled this far inside their tips (common practice, no source: 10 to 15). */
const drillInside = 12;
/** The zip at the centre back ends this far above the hip, as on the gown. */
const zipAboveHip = 20;

/** The side of a quarter from the waist to the hem: fair to the hip, straight below it. */
export const sideOf = (plan: QuarterPlan, { hip, hem }: SkirtHeights): Path => [
  ...profilePath(plan.curve, plan.sideTop, hip),
  line(point(plan.figures.hip, hip), point(plan.figures.hip, hem)),
];

/** Front or back of the skirt block from the waist to the hem. */
export function skirtPiece(plan: QuarterPlan, heights: SkirtHeights, topHip: number): Piece {
  const { side, figures } = plan;
  const { waist, hip, hem } = heights;
  const front = side === 'front';
  const strokes = front ? 1 : 2;
  const sideEdge = edge(
    'side',
    'side',
    sideOf(plan, heights),
    to(front ? nameOf.back : nameOf.front, 'side'),
  );
  const centre = edge(
    'centre',
    front ? 'fold' : 'zip',
    [line(point(0, hem), point(0, waist))],
    front ? undefined : 'self',
  );
  const darts = waistDarts(plan.waist, plan.tips);
  const hipArc = pathLength(profilePath(plan.curve, plan.sideTop, hip));
  return {
    name: nameOf[side],
    title: front ? 'Skirt block, front' : 'Skirt block, back',
    side,
    part: 'middle',
    cut: front ? 'cut 1 on fold' : 'cut 2 (a pair)',
    copies: front ? 1 : 2,
    edges: [
      ...waistEdges(plan.waist),
      sideEdge,
      edge('hem', 'hem', [line(point(figures.hip, hem), point(0, hem))]),
      centre,
    ],
    darts,
    levels: [
      levelLine('top-hip', point(0, topHip), point(xAt(plan.curve, topHip), topHip)),
      levelLine('hip', point(0, hip), point(figures.hip, hip)),
      levelLine('hem', point(0, hem), point(figures.hip, hem)),
    ],
    notches: [
      ...notchAtLength('hip', sideEdge, hipArc, strokes),
      ...(front ? [] : notchAtHeight('zip-end', centre, hip - zipAboveHip, strokes)),
    ],
    grain: {
      from: point(figures.hip * 0.62, hip + 0.05 * (hem - hip)),
      to: point(figures.hip * 0.62, hip + 0.8 * (hem - hip)),
    },
    drills: darts.flatMap((dart) => onDartAxis(dart, drillInside)),
  };
}
