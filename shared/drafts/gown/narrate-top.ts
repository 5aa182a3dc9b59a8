import type { DraftingTable, PartTable } from '../../drafting/drafting-table.ts';
import { type Quantity, amount, leastSaid } from '../../drafting/quantity.ts';
import { pathLength } from '../../geometry/curve.ts';
import type { Path } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { type Said, mm, said } from '../../units/said.ts';
import { type Half, heightOn } from './half.ts';
import { intakeEdge, princessBelow, princessWhole, topDarts, wholeDarts } from './intakes.ts';
import type { GownStyle } from './style-card.ts';
import type { TopLine, TopLinePoints } from './top-line.ts';
import type { TopWidth } from './top-line-points.ts';
import { topNames } from './top-names.ts';

/** The top line stays at least this far above the bust point. */
const overBust = 30;

/** Records the top line, and says where it passes low over the bust point. */
export function narrateTop(
  table: DraftingTable,
  paper: PartTable,
  half: Half,
  points: TopLinePoints,
  top: TopLine,
): void {
  const { centre, peak, side, sideLean, shape } = points;
  const off = sideLean === undefined;
  const start = !peak
    ? said`From ${mm(half.levels.waist - centre.y)} above the waist at the centre`
    : shape === undefined
      ? said`Level from the centre, ${mm(centre.y)} down, to ${mm(peak.x)} out, and on`
      : said`From ${mm(centre.y)} down at the centre up to the peak, ${mm(peak.x)} out and ${mm(peak.y)} down, and on`;
  const leaves =
    shape === 'notched' ? 'meets the centre in a notch' : 'sets out square to the centre';
  const end = off
    ? said` to the end of the band's edge, ${mm(side.x)} out and ${mm(side.y)} down`
    : peak
      ? said` to the side seam ${mm(side.y)} down`
      : said` to the side seam, where it meets the front`;
  paper.draw(
    'Top line',
    said`${start}${end}; drawn with the opening closed so that it crosses the seam without a kink, ${mm(pathLength(top.centre) + pathLength(top.outer))} long when sewn.`,
    {
      why: off
        ? said`It ${leaves} and bends one way only to the armhole, so that the band can carry it on.`
        : said`It ${leaves} and arrives square to the side seam, so front and back join without a corner.`,
      points: { 'top-centre': centre, ...(peak ? { 'top-peak': peak } : {}), 'top-side': side },
      lines: [top.centre, top.outer],
    },
  );
  const bust = heightOn(half, 'bust', half.axis);
  if (half.side === 'front' && bust - top.crossing < overBust) {
    table.warn({
      code: 'top-line-low',
      severity: 'warning',
      field: 'style.topDrop',
      with: ['style.sideDepth'],
      said: said`The top line passes ${mm(bust - top.crossing)} above the bust point; under ${mm(overBust)} it may not hold. Raise the top line or the side.`,
    });
  }
}

/** Records the armhole edge of a gown off the shoulder. */
export function narrateArmhole(
  paper: PartTable,
  top: TopLine,
  armhole: Path,
  { across, halfAcross, opening }: TopWidth & { readonly across: Quantity },
): void {
  const from = top.outer.at(-1)?.to;
  const until = armhole.at(-1)?.to;
  if (!from || !until) return;
  const kept = halfAcross + opening - from.x;
  const half = said`Half of the measure ${across.how}${opening < leastSaid ? '' : said` and the opening ${mm(opening)}`}`;
  const how: Said =
    kept > 0.05
      ? said`${half} would reach too near the side; its upper end is kept ${mm(from.x)} out`
      : kept < -0.05
        ? said`${half} would end too near the bust seam, or leave a flat armhole; its upper end is set ${mm(from.x)} out`
        : said`${half} ${opening < leastSaid ? 'puts' : 'put'} its upper end ${mm(from.x, across.measures)} out`;
  paper.draw(
    'Armhole edge',
    said`${how}, ${mm(from.y)} down; from there square to the top line, down and out to the underarm, ${mm(until.x)} out, square to the side seam: ${mm(pathLength(armhole))} long.`,
    {
      why: said`The band is set in along its upper part; under the arm the edge stays free, so that the arm can be lifted.`,
      points: { 'armhole-top': from, underarm: until },
      lines: [armhole],
      measures: across.measures,
    },
  );
}

/** What an intake takes at the levels it passes, and how it ends. */
const taking = (half: Half, { waistSeam }: GownStyle): Said => {
  const underbust = said`${amount(half.gap.underbust)} at the under-bust`;
  if (waistSeam !== 'none')
    return said`${underbust} and ${amount(half.gap.seam)} at the waist seam`;
  return said`${underbust} and ${amount(half.gap.waist)} at the waist, running out ${mm((half.dartTips[0] ?? half.levels.waist) - half.levels.waist)} below it`;
};

/** Records a princess seam. */
export function narratePrincess(
  paper: PartTable,
  half: Half,
  style: GownStyle,
  opening: number,
  height: number,
): void {
  const whole = style.waistSeam === 'none';
  const below = whole ? princessWhole(half) : princessBelow(half);
  const names = topNames(half.side, style);
  const above =
    opening > 0
      ? said`opens to ${mm(opening)} at ${mm(below.top - height)} above it`
      : said`stays closed above it`;
  const on = whole ? said`, and from there goes straight on to the knee seam` : said``;
  paper.draw(
    'Princess seam',
    said`${mm(half.axis)} out from the centre both panels pass ${half.side === 'front' ? 'the bust point' : 'bust level'} upright. Below it the gap is ${taking(half, style)}${on}, half on each side; the seam ${above}.`,
    {
      why: said`The edges swell outside the straight legs and never cut the corner at bust level, which would cost girth there.`,
      points: { 'bust-point': point(half.axis, below.top) },
      lines: [intakeEdge(below, 'centre'), intakeEdge(below, 'side')],
      pieces: [names.centre, names.side],
    },
  );
}

/** Records the darts of a top. */
export function narrateDarts(
  paper: PartTable,
  half: Half,
  style: GownStyle,
  opening: number,
  clearance: number,
): void {
  const whole = style.waistSeam === 'none';
  const darts = whole ? wholeDarts(half, clearance) : topDarts(half, clearance);
  const above = opening > 0 ? said`; one from the top line takes ${mm(opening)}` : said``;
  const count = darts.length === 1 ? 'One dart' : 'Two darts';
  const from = whole
    ? darts.length === 1
      ? ' pointed at both ends'
      : ', pointed at both ends'
    : ' from the waist seam';
  paper.draw(
    'Bust darts',
    said`${count}${from}, ending ${mm(clearance)} short of ${half.side === 'front' ? 'the bust point' : 'bust level'}: ${taking(half, style)}${above}.`,
    {
      why: said`A dart that ran all the way would stand up in a point; stopped short it melts into the curve.`,
      lines: darts.flatMap((dart) => [intakeEdge(dart, 'centre'), intakeEdge(dart, 'side')]),
      pieces: [topNames(half.side, style).one],
    },
  );
}
