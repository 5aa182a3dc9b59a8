import type { DraftingTable, PartTable } from '../../drafting/drafting-table.ts';
import { amount, leastSaid, worked } from '../../drafting/quantity.ts';
import { line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { profilePath, slopeAt, steepest, xAt } from '../../geometry/profile.ts';
import { type Said, deg, mm, said } from '../../units/said.ts';
import type { Contour } from './contour.ts';
import { type Half, dartShares } from './half.ts';
import type { PairedHalves } from './pair-halves.ts';
import type { Quarters } from './quarters.ts';
import type { GownStyle } from './style-card.ts';

const levelRows = [
  ['bust', 'Bust line'],
  ['underbust', 'Under-bust line'],
  ['waist', 'Waist line'],
  ['topHip', 'Top hip line'],
  ['hip', 'Hip line'],
  ['knee', 'Knee seam line'],
] as const;

const balanceWhy = said`The balance moves the side seam between front and back: what the front gains, the back gives.`;

/** Records how a half came about: its quarters, suppression, side seam, waist seam and intakes. */
export function narrateHalf(
  table: DraftingTable,
  half: Half,
  quarters: Quarters,
  contour: Contour,
  moved: number,
  waistSeam: GownStyle['waistSeam'],
): PartTable {
  const paper = table.part(half.side === 'front' ? 'Front' : 'Back', half.side);
  for (const [level, title] of levelRows) {
    paper.squareAcross(
      title,
      half.levels[level],
      quarters[level],
      level === 'bust' ? balanceWhy : undefined,
    );
  }
  narrateSuppression(table, paper, half);
  narrateSide(paper, half);
  narrateContour(paper, half, quarters, contour, moved);
  narrateWaistSeam(paper, half, quarters, waistSeam !== 'none');
  return paper;
}

function narrateSuppression(table: DraftingTable, paper: PartTable, half: Half): void {
  const { suppression, quarters, side } = half;
  const mean = (quarters.bust + quarters.hip) / 2;
  const inwards = mean - suppression.side;
  const shares = dartShares(half.dartCount);
  const darts =
    suppression.dart === 0
      ? 'nothing is left for a dart'
      : shares.length === 1
        ? said`the dart or princess line takes ${mm(suppression.dart)}`
        : said`two darts take ${mm(suppression.dart * (shares[0] ?? 1))} and ${mm(suppression.dart * (shares[1] ?? 0))}`;
  paper.draw(
    'Waist suppression',
    said`Mean of bust and hip quarters ${mm(mean, ['bustGirth', 'hipGirth'])} less the waist quarter ${mm(quarters.waist, ['waistGirth'])} ${
      suppression.whole >= leastSaid
        ? said`leaves ${mm(suppression.whole, ['bustGirth', 'hipGirth', 'waistGirth'])} to take in. The side seam ${
            Math.abs(inwards) < leastSaid
              ? said`takes none of it`
              : said`${inwards > 0 ? 'takes' : 'stands out by'} ${mm(Math.abs(inwards))}`
          }; ${darts}`
        : said`leaves nothing to take in: the side seam passes through the waist quarter, no dart`
    }.`,
    {
      why: said`The side seam stays inside the bust and leans at most 25°, so that it hangs without a hollow.`,
      points: {
        'waist-quarter': point(quarters.waist, half.heights.waist),
        'bust-hip-mean': point(mean, half.heights.waist),
      },
      lines: [
        [
          line(
            point(Math.min(quarters.waist, mean), half.heights.waist),
            point(Math.max(quarters.waist, mean), half.heights.waist),
          ),
        ],
      ],
      measures: ['bustGirth', 'hipGirth', 'waistGirth'],
    },
  );
  if (suppression.steep) {
    table.warn({
      code: `${side}-side-steep`,
      severity: 'warning',
      field: 'card.waistGirth',
      with: ['card.hipGirth'],
      said: said`The ${side} side seam leans more than 25° between bust and hip: that is the least this body allows. Check waist, hip and waist to hip, and look at the hip curve in the toile.`,
    });
  }
  if (suppression.dart * (shares[0] ?? 1) > 45) {
    table.warn({
      code: `${side}-dart-wide`,
      severity: 'warning',
      field: 'card.waistGirth',
      with: ['card.hipGirth'],
      said: said`The ${side} waist dart takes ${mm(suppression.dart * (shares[0] ?? 1))} even in two: fit it in the toile, or give the side seam a larger share in the house rules.`,
    });
  }
}

/** A lean under this reads as upright, degrees. */
const leastLean = 0.5;

/** How the side stands at bust and hip: upright, or leaning where upright it would bend too often. */
function uprightness({ line, heights }: Half): Said {
  const leanAt = (y: number): number => (Math.abs(Math.atan(slopeAt(line, y))) * 180) / Math.PI;
  const [bust, hip] = [leanAt(heights.bust), leanAt(heights.hip)];
  if (bust < leastLean && hip < leastLean) return said`upright at bust and hip`;
  return said`leaning ${deg(bust)} at the bust and ${deg(hip)} at the hip, where upright it would bend too often`;
}

function narrateSide(paper: PartTable, half: Half): void {
  const { line, heights, side } = half;
  const lean = (Math.atan(steepest(line, heights.bust, heights.hip)) * 180) / Math.PI;
  const trued =
    side === 'front'
      ? said`It is the master for the back.`
      : said`Its heights are trued: from the waist every level lies as far along the seam as on the front.`;
  paper.draw(
    'Side seam',
    said`One fair curve through bust, waist, top hip and hip, ${uprightness(half)}, then upright into the knee seam; it leans ${deg(lean)} at most. ${trued}`,
    {
      lines: [profilePath(line, heights.underarm, heights.knee)],
      points: {
        'side-bust': point(xAt(line, heights.bust), heights.bust),
        'side-waist': point(xAt(line, heights.waist), heights.waist),
        'side-hip': point(xAt(line, heights.hip), heights.hip),
        'side-knee': point(xAt(line, heights.knee), heights.knee),
      },
    },
  );
}

function narrateContour(
  paper: PartTable,
  half: Half,
  quarters: Quarters,
  contour: Contour,
  moved: number,
): void {
  const { side, heights } = half;
  const both = ['bustGirth', 'upperChestGirth'];
  const less = quarters.bust.value - quarters.chest.value;
  const shared =
    Math.abs(contour.reduction - less) < leastSaid
      ? said``
      : side === 'front'
        ? said`; with ${mm(moved)} from the back, whose side would lean too far, it is ${amount(contour.reduction)}`
        : said`; what its side cannot lean, ${mm(moved)}, goes to the front and ${amount(contour.reduction)} stays`;
  const lean =
    Math.abs(contour.lean) < leastSaid
      ? said`the side stays upright`
      : said`the side leans ${contour.lean < 0 ? 'out' : 'in'} by ${mm(Math.abs(contour.lean))}`;
  const opening =
    contour.opening === 0
      ? said`no opening is needed`
      : said`the opening at the top edge takes ${mm(contour.opening)}`;
  paper.draw(
    'Above the bust',
    said`Bust quarter ${mm(quarters.bust.value, quarters.bust.measures)} less upper chest quarter (${worked(quarters.chest)}) leaves ${amount(less, both)}${shared}: ${lean}, ${opening}.`,
    {
      why: said`This is the only amount taken out above the bust: with it the top edge lies on the upper chest and cannot gape.`,
      points: { 'side-chest': point(xAt(half.line, heights.underarm), heights.underarm) },
      lines: [
        [
          line(
            point(xAt(half.line, heights.underarm), heights.underarm),
            point(quarters.bust.value, heights.underarm),
          ),
        ],
        profilePath(half.line, heights.underarm, heights.bust),
      ],
      measures: both,
    },
  );
}

function narrateWaistSeam(paper: PartTable, half: Half, quarters: Quarters, sewn: boolean): void {
  const fall = half.seam.to.y - half.seam.from.y;
  const way =
    Math.abs(fall) < leastSaid
      ? said`stays level`
      : said`${fall > 0 ? 'falls' : 'rises'} ${mm(Math.abs(fall))}`;
  paper.draw(
    sewn ? 'Waist seam' : 'Waist, closed',
    said`Drawn with its intake closed, ${mm(quarters.seam.value, quarters.seam.measures)} long (${quarters.seam.how}): square at the centre, it ${way} at the side, then ${half.gap.seam < leastSaid ? said`needs no opening` : said`is opened by ${mm(half.gap.seam)}`}.`,
    {
      why: sewn
        ? said`Top and middle are cut from this one line, so they are equal by construction.`
        : said`No seam is cut here: the line only holds the waist, which darts and panel seams take in.`,
      lines: [[half.seam]],
      measures: quarters.seam.measures,
    },
  );
}

/** A shift of the back's levels beyond this is worth a look at the measures. */
const farShift = 8;

/** Says where truing moved a level of the back farther than 8 mm. */
export function warnOfShift(table: DraftingTable, { back }: PairedHalves): void {
  const shifted = levelRows
    .map(([level, title]) => ({ title, by: back.heights[level] - back.levels[level] }))
    .filter(({ by }) => Math.abs(by) > farShift);
  const [first] = shifted;
  if (!first) return;
  table.warn({
    code: 'back-trued-far',
    severity: 'warning',
    field: 'card.waistGirth',
    with: ['card.hipGirth', 'card.bustGirth'],
    said: said`Truing the back to the front moved its ${first.title.toLowerCase()} by ${mm(Math.abs(first.by))} at the side. The seams meet; look at the level in the toile.`,
  });
}
