import type { Body, MeasureKey } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { dartOpening } from '../../drafting/dart-angle.ts';
import type { DraftingTable, PartTable } from '../../drafting/drafting-table.ts';
import type { Piece } from '../../drafting/piece.ts';
import { amount, leastSaid } from '../../drafting/quantity.ts';
import { pathLength } from '../../geometry/curve.ts';
import { line } from '../../geometry/path.ts';
import { type Point, distance } from '../../geometry/point.ts';
import { type Said, deg, mm, said } from '../../units/said.ts';
import type { BustDartAngle } from './bust-dart.ts';
import { backWidthEase } from './pair-armholes.ts';
import { type BodiceHalf, type BodiceQuarters, bodiceBack, bodiceFront, sideOf } from './pieces.ts';
import { type OpenedShoulder, shoulderTilt } from './shoulder.ts';
import type { BustDartPlace } from './style-card.ts';

/** The armhole stays this far above the bust line, so that the bust girth is counted from seam to seam. */
const aboveBust = 10;

/** Hangs the level at which armhole and side seam meet and gives its height. */
export function blockUnderarm(table: DraftingTable, levels: BodyLevels, drop: number): number {
  const wished = levels.underarm + drop;
  const lowest = levels.bust - aboveBust;
  return table
    .part('Levels', 'both')
    .level(
      'Armhole',
      wished <= lowest
        ? said`Underarm lowered by ${mm(drop)} for the arm to move`
        : said`Underarm lowered by ${mm(drop)} would pass the bust line; it stays ${mm(aboveBust)} above it`,
      Math.min(wished, lowest),
      [],
      wished <= lowest ? ['underarmToWaist'] : [],
    );
}

/** What only one of the halves has. */
type Own =
  | {
      readonly opened: OpenedShoulder;
      readonly angle: BustDartAngle;
      readonly place: BustDartPlace;
    }
  | { readonly shoulderEase: number };

/** Records how a half came about and gives its paper for what follows. */
export function narrateHalf(
  table: DraftingTable,
  body: Body,
  half: BodiceHalf,
  quarters: BodiceQuarters,
  own: Own,
): PartTable {
  const { plan, heights } = half;
  const paper = table.part(plan.side === 'front' ? 'Front' : 'Back', plan.side);
  paper.squareAcross(
    'Bust line',
    heights.bust,
    quarters.bust,
    said`The balance moves the side seam between front and back: what the front gains, the back gives.`,
  );
  paper.squareAcross('Waist line', heights.waist, quarters.waist);
  narrateSide(paper, half);
  narrateWaist(paper, half, quarters);
  narrateShoulder(paper, body, half, own);
  if ('opened' in own) narrateDart(paper, own.opened, own.angle);
  narrateArmhole(paper, body, half, 'place' in own && own.place !== 'shoulder');
  return paper;
}

function narrateSide(paper: PartTable, { plan, rules }: BodiceHalf): void {
  const { side, darts } = plan.intake;
  const path = sideOf(plan);
  const way =
    Math.abs(side) < leastSaid
      ? said`hangs straight`
      : said`runs ${side > 0 ? 'in' : 'out'} by ${mm(Math.abs(side))}`;
  paper.draw(
    'Side seam',
    said`Bust quarter ${mm(plan.figures.bust, ['bustGirth'])} less waist quarter ${mm(plan.figures.waist, ['waistGirth'])} is ${amount(plan.figures.bust - plan.figures.waist, ['bustGirth', 'waistGirth'])}: the side seam ${way}, ${darts === 0 ? 'nothing is left for a dart' : said`waist darts take ${mm(darts)}`}. It is straight and ${mm(pathLength(path))} long.`,
    {
      why: said`The side seam takes about ${Math.round(rules.sideShare * 100)} % of what goes out, alike in front and back, so that both sides fall together.`,
      points: { underarm: plan.underarm, 'side-waist': plan.waistEnd },
      lines: [path],
      measures: ['bustGirth', 'waistGirth'],
    },
  );
}

function narrateWaist(paper: PartTable, { plan }: BodiceHalf, quarters: BodiceQuarters): void {
  const { stretches, mouths } = plan.waist;
  const darts =
    mouths.length === 0
      ? said`no dart`
      : said`${mouths.length === 1 ? 'one dart of' : 'two darts, together'} ${mm(plan.intake.darts)}`;
  paper.draw(
    'Waist seam',
    said`Square to the centre line and to the side seam, with ${darts}: sewn, it is ${mm(quarters.waist.value, quarters.waist.measures)} long, the waist quarter.`,
    {
      why: said`It meets the legs of each dart squarely, so it runs on as one smooth curve when the dart is closed.`,
      lines: [
        ...stretches,
        ...mouths.flatMap(({ centre, side }, k) => {
          const tip = { x: (centre.x + side.x) / 2, y: plan.tips[k] ?? centre.y };
          return [[line(centre, tip)], [line(side, tip)]];
        }),
      ],
      measures: ['waistGirth'],
    },
  );
}

const estimate = (body: Body, key: MeasureKey): string =>
  key in body.estimated ? ' (estimated)' : '';

function narrateShoulder(
  paper: PartTable,
  body: Body,
  { plan, shoulder }: BodiceHalf,
  own: Own,
): void {
  const { neckGirth, shoulderLength, shoulderSlope, backWaistLength } = body.measures;
  const front = plan.side === 'front';
  const neck: Said = front
    ? said`A fifth of the neck girth ${mm(neckGirth)}${estimate(body, 'neckGirth')} less ${mm(2)} gives the depth ${mm(shoulder.centreNeck.y, ['neckGirth'])} at the centre front`
    : said`Back waist length ${mm(backWaistLength)}${estimate(body, 'backWaistLength')} up from the waist lies the nape. A fifth of the neck girth ${mm(neckGirth)}${estimate(body, 'neckGirth')} less ${mm(2)} gives the width ${mm(shoulder.sideNeck.x, ['neckGirth'])}; the side neck lies a third of it above the nape`;
  paper.draw(
    'Neck',
    said`${neck}; the curve leaves the centre line and meets the shoulder squarely, ${mm(pathLength(shoulder.neck))} long.`,
    {
      points: { 'side-neck': shoulder.sideNeck },
      lines: [shoulder.neck],
      measures: front ? ['neckGirth'] : ['backWaistLength', 'neckGirth'],
    },
  );
  const ease = 'shoulderEase' in own ? own.shoulderEase : 0;
  paper.draw(
    'Shoulder',
    said`Shoulder slope ${deg(shoulderSlope)}${estimate(body, 'shoulderSlope')} ${front ? 'less' : 'plus'} ${deg(shoulderTilt)}; shoulder length ${mm(shoulderLength)}${estimate(body, 'shoulderLength')}${ease === 0 ? '' : said` + ease ${mm(ease)} = ${mm(shoulder.length, ['shoulderLength'])}`}.`,
    {
      why: front
        ? said`The seam lies a little forward of the top of the shoulder, so the front slopes less than the back.`
        : said`The longer back shoulder is eased in over the roundness of the blade.`,
      points: { shoulder: shoulder.tip },
      lines: [[line(shoulder.sideNeck, shoulder.tip)]],
      measures: ['shoulderSlope', 'shoulderLength'],
    },
  );
}

function narrateDart(paper: PartTable, opened: OpenedShoulder, angle: BustDartAngle): void {
  const leg = distance(opened.bustPoint, opened.nearMouth);
  paper.draw(
    'Bust dart',
    said`Angle at the bust point: ${angle.how}. On legs of ${mm(leg)} it opens the middle of the shoulder by ${mm(dartOpening(angle.angle, leg))}; the outer shoulder is turned out by it.`,
    {
      why: said`The opening is added to the width and never taken from it: sewn, the shoulder is as long as before, and the cloth stands out over the bust.`,
      points: { 'bust-point': opened.bustPoint, 'shoulder-opened': opened.tip },
      lines: [
        [line(opened.nearMouth, opened.bustPoint)],
        [line(opened.farMouth, opened.bustPoint)],
        [line(opened.farMouth, opened.tip)],
      ],
      measures: angle.measures,
    },
  );
}

function narrateArmhole(
  paper: PartTable,
  body: Body,
  { plan, armhole }: BodiceHalf,
  dartToMove: boolean,
): void {
  const key = plan.side === 'front' ? 'acrossFront' : 'acrossBack';
  const name = plan.side === 'front' ? 'across front' : 'across back';
  const shift = armhole.upright.x - armhole.asked;
  const note: Said =
    Math.abs(shift) < 0.5
      ? said``
      : said` It stands ${mm(Math.abs(shift))} farther ${shift < 0 ? 'in' : 'out'} than that, so that the arm has room and the curve bends one way.`;
  paper.draw(
    'Armhole',
    said`From the shoulder down past an upright ${mm(armhole.upright.x)} from the centre, from half the ${name} ${mm(body.measures[key])}${estimate(body, key)}${plan.side === 'front' ? said` turned out with the bust dart` : said` and ${mm(backWidthEase)} of ease`}, to the underarm: ${mm(pathLength(armhole.path))} long.${note}`,
    {
      why: said`It is square to the shoulder and to the side seam, so that front and back run on as one curve when they are sewn.`,
      points: { upright: armhole.upright },
      lines: [armhole.path],
      measures: [key],
      ...(dartToMove ? {} : { pieces: [plan.side === 'front' ? bodiceFront : bodiceBack] }),
    },
  );
}

const called: { readonly [P in BustDartPlace]: string } = {
  shoulder: 'shoulder',
  armhole: 'armhole',
  side: 'side seam',
  waist: 'waist seam',
  neck: 'neck',
  topLine: 'upper edge, straight above it',
};

/** Height of a strapless top line above the bust line, where its peak lies (method section 6). */
const strapless = 85;

const whyMoved: { readonly [P in BustDartPlace]?: Said } = {
  topLine: said`There the princess seam of a gown leaves its top line: draw the top line across the two legs and cut away what lies above.`,
  armhole: said`The angle at the bust point stays, so does every seam; what a round edge cannot fold is sewn in the waist.`,
};

/** Records where the bust dart was turned to; nothing where it stayed in the shoulder. */
export function narratePlace(
  paper: PartTable,
  front: Piece,
  place: BustDartPlace,
  {
    angle,
    share,
    bustPoint,
  }: { readonly angle: number; readonly share: number; readonly bustPoint: Point },
): void {
  if (place === 'shoulder') return;
  const own = front.darts.find(({ name }) => name === 'bust');
  const dart = own ?? front.darts[0];
  const mouthAt = dart?.centreLeg[0]?.from ?? bustPoint;
  const reach = distance(mouthAt, bustPoint);
  const here = angle * share;
  const opening = own
    ? said`${deg(here)} there open it by ${mm(dartOpening(here, reach))}`
    : said`the waist dart grows by its ${deg(angle)}`;
  const rest: Said =
    share === 1
      ? said``
      : said` The other ${deg(angle - here)} are sewn in the waist: so round an armhole folds no wider dart.`;
  const atTopLine: Said =
    place === 'topLine'
      ? said` On a strapless top line, ${mm(strapless)} above the bust line, that is ${mm(2 * strapless * Math.tan((angle * Math.PI) / 360))}.`
      : said``;
  paper.draw(
    'Dart moved',
    said`The shoulder dart is closed and the paper cut from the bust point to the ${called[place]}: ${opening}.${rest}${atTopLine}`,
    {
      why:
        whyMoved[place] ??
        said`The angle at the bust point stays, so does every seam; only the opening grows with its distance from the bust point.`,
      lines: [
        front.edges.flatMap((edge) => edge.path),
        ...front.darts.flatMap((each) => [each.centreLeg, each.sideLeg]),
      ],
    },
  );
}
