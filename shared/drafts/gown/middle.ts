import type { PartTable } from '../../drafting/drafting-table.ts';
import {
  drillPoints,
  edge,
  levelLine,
  mouth,
  notchAtHeight,
  notchAtLength,
  to,
} from '../../drafting/outline.ts';
import { amount } from '../../drafting/quantity.ts';
import type { Dart, Edge, Piece } from '../../drafting/piece.ts';
import { endOf, pathLength, startOf } from '../../geometry/curve.ts';
import { type Path, line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { profilePath, xAt } from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { type Half, atSide, dartShares } from './half.ts';
import { intakeEdge, middleDarts, seamStretches } from './intakes.ts';
import { type PanelFoot, cornered } from './skirt-foot.ts';

/** The zip ends this far above the hip at the highest. */
const zipAboveHip = 20;
const letters = ['a', 'b', 'c'];

/** Names of the stretches of the waist seam, from the centre out. */
export const waistStretch = (k: number): string => `waist-${letters[k] ?? String(k)}`;

/** Which piece of the top each stretch of the waist seam is sewn to. */
export type TopPartner = (stretch: number) => string;

/** Front or back from the waist seam down: one quarter, with the darts of the waist and its foot. */
export function middlePiece(
  paper: PartTable,
  half: Half,
  foot: PanelFoot,
  topPartner: TopPartner,
): Piece {
  const { side, heights, levels, line: seam } = half;
  const name = `${side}-middle`;
  const strokes = side === 'front' ? 1 : 2;
  const darts = middleDarts(half);
  const openings = dartShares(half.dartCount).map((share) => share * half.gap.seam);
  const stretches = seamStretches(half, openings);
  const sewn: Dart[] = darts.flatMap((intake, k) => {
    if (half.gap.waist === 0 && half.gap.seam === 0) return [];
    const open = (openings[k] ?? 0) > 0;
    return [
      {
        name: k === 0 ? 'waist' : `waist-${k + 1}`,
        tip: open ? 'below' : 'both',
        centreLeg: intakeEdge(intake, 'centre'),
        sideLeg: intakeEdge(intake, 'side'),
        ...(open ? { mouth: `waist-mouth-${letters[k] ?? ''}` } : {}),
        pressed: 'centre',
      },
    ];
  });
  const sideEdge = edge(
    'side',
    'side',
    [...profilePath(seam, heights.seam, heights.knee), ...foot.outer],
    to(side === 'front' ? 'back-middle' : 'front-middle', 'side'),
  );
  const kneeSide = point(xAt(seam, heights.knee), heights.knee);
  const kneeCentre = point(0, heights.knee);
  const centreTop = startOf(stretches[0] ?? []) ?? point(0, levels.seam);
  const centre = cornered(
    edge(
      'centre',
      side === 'front' ? 'fold' : 'zip',
      [...foot.inner, line(kneeCentre, centreTop)],
      side === 'front' ? undefined : 'self',
    ),
    foot,
  );
  const seamed = foot.edges.some(({ kind }) => kind === 'hem') ? 'hem' : 'knee seam';
  narrateDarts(paper, half, sewn);
  paper.draw(
    'Skirt',
    said`From the waist seam to the ${seamed} the quarter is cut in one: side ${mm(pathLength(sideEdge.path))} long, ${mm(kneeSide.x)} wide at the ${seamed === 'hem' ? 'knee line' : seamed}.`,
    {
      lines: [
        sideEdge.path,
        ...foot.edges.map((each) => each.path),
        ...stretches,
        ...sewn.flatMap((dart) => [dart.centreLeg, dart.sideLeg]),
      ],
      pieces: [name],
    },
  );
  return {
    name,
    title: side === 'front' ? 'Front skirt' : 'Back skirt',
    side,
    part: 'middle',
    cut: side === 'front' ? 'cut 1 on fold' : 'cut 2 (a pair)',
    copies: side === 'front' ? 1 : 2,
    edges: [...waistEdges(stretches, sewn, topPartner), sideEdge, ...foot.edges, centre],
    darts: sewn,
    levels: [
      // A seam in the waist itself is the waist; it is counted along the seam.
      ...(levels.seam === levels.waist
        ? []
        : [levelLine('waist', point(0, levels.waist), atSide(half, 'waist'))]),
      levelLine(
        'top-hip',
        point(0, levels.topHip),
        point(xAt(seam, heights.topHip), heights.topHip),
      ),
      levelLine('hip', point(0, levels.hip), point(xAt(seam, heights.hip), heights.hip)),
      levelLine('knee-seam', kneeCentre, kneeSide),
    ],
    notches: [
      ...secondDartMark(stretches, topPartner, strokes),
      ...(levels.seam === levels.waist
        ? []
        : notchAtHeight('waist', sideEdge, heights.waist, strokes)),
      ...notchAtHeight('hip', sideEdge, heights.hip, strokes),
      ...foot.notches,
      ...centreMarks(half, centre),
    ],
    grain: grainIn(half),
    drills: drillPoints(sewn),
  };
}

/** Marks on the centre back: the waist, where it is no corner, and the end of the zip. */
export const centreMarks = ({ side, levels }: Half, centre: Edge): Piece['notches'] =>
  side === 'front'
    ? []
    : [
        ...(levels.seam === levels.waist && endOf(centre.path)?.y === levels.waist
          ? []
          : notchAtHeight('waist', centre, levels.waist, 2)),
        ...notchAtHeight('zip-end', centre, levels.hip - zipAboveHip, 2),
      ];

function narrateDarts(paper: PartTable, half: Half, darts: readonly Dart[]): void {
  if (darts.length === 0) return;
  const tips = half.dartTips.map((tip) => tip - half.levels.waist);
  const [first = 0, second] = tips;
  const reach =
    half.gap.waist === 0
      ? said`running out at the waist`
      : second === undefined
        ? said`ending ${mm(first)} below it`
        : said`ending ${mm(first)} and ${mm(second)} below it`;
  paper.draw(
    'Waist darts',
    said`${darts.length === 1 ? 'One dart:' : 'Two darts, sharing 60 to 40:'} ${amount(half.gap.seam)} at the waist seam, which the legs cross upright, ${amount(half.gap.waist)} at the waist, ${reach}.`,
    {
      why: said`The legs cross the waist seam upright, so sewing the dart only shifts the seam and leaves no kink.`,
      lines: darts.flatMap((dart) => [dart.centreLeg, dart.sideLeg]),
    },
  );
}

/** Marks the second dart against the side panel of the top, which has no dart there. */
function secondDartMark(
  stretches: readonly Path[],
  partner: TopPartner,
  strokes: 1 | 2,
): Piece['notches'] {
  const [, before, after] = stretches;
  if (!before || !after || partner(1) !== partner(2) || partner(0) === partner(1)) return [];
  const own = edge(waistStretch(1), 'seam', before);
  return notchAtLength('second-dart', own, pathLength(before), strokes);
}

/** Beside the darts, between hip and knee. */
const grainIn = (half: Half): { readonly from: Point; readonly to: Point } => {
  const reach = half.levels.knee - half.levels.hip;
  const x = xAt(half.line, half.levels.hip) * 0.62;
  return {
    from: point(x, half.levels.hip + 0.05 * reach),
    to: point(x, half.levels.hip + 0.75 * reach),
  };
};

/** Stretches of the waist seam with the mouths of their darts between, from the centre out. */
export function waistEdges(
  stretches: readonly Path[],
  darts: readonly Dart[],
  partner: TopPartner,
): readonly Edge[] {
  return stretches.flatMap((path, k) => {
    const own = edge(waistStretch(k), 'seam', path, to(partner(k), waistStretch(k)));
    const after = stretches[k + 1];
    const name = darts[k]?.mouth;
    const from = endOf(path);
    const until = after ? startOf(after) : undefined;
    return name && from && until ? [own, mouth(name, from, until)] : [own];
  });
}
