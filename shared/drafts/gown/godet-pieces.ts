import type { PartTable } from '../../drafting/drafting-table.ts';
import { edge, to } from '../../drafting/outline.ts';
import type { Edge, EdgeRef, Piece, Side } from '../../drafting/piece.ts';
import { arc } from '../../geometry/arc.ts';
import { reverse } from '../../geometry/curve.ts';
import { line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { deg, mm, said } from '../../units/said.ts';
import {
  type GodetPlace,
  type GodetPlan,
  godetCount,
  halfName,
  isDivided,
  kindOf,
  markOn,
  radiusOf,
} from './godets.ts';

const titles: { readonly [P in GodetPlace]: string } = {
  side: 'Godet, side seam',
  'centre-back': 'Godet, centre back',
  'front-princess': 'Godet, front princess seam',
  'back-princess': 'Godet, back princess seam',
};

/** A side godet lies with the front piece before it and the back piece after it. */
const sideOf = (place: GodetPlace): Side =>
  place === 'side' || place === 'front-princess' ? 'front' : 'back';

/** The open edges of the panels either side of a godet: before it, and after it, seen from outside. */
type Slits = { readonly near: EdgeRef; readonly far: EdgeRef };

/** Finds the panels a godet lies between. */
function slitsOf({ panels }: GodetPlan, place: GodetPlace): Slits {
  const named = (side: Side, seam: 'inner' | 'outer', name: string): EdgeRef => {
    const panel = panels.find((each) => each.side === side && each[seam] === name);
    return to(panel?.piece ?? '', `godet-${name}`);
  };
  if (place === 'side')
    return { near: named('front', 'outer', 'side'), far: named('back', 'outer', 'side') };
  if (place === 'centre-back') {
    const centre = named('back', 'inner', 'centre');
    return { near: centre, far: centre };
  }
  const side = sideOf(place);
  return { near: named(side, 'outer', 'princess'), far: named(side, 'inner', 'princess') };
}

type Sector = {
  readonly from: number;
  readonly until: number;
  /** Right edge, downwards, and left edge, upwards. */
  readonly right: Omit<Edge, 'path' | 'corner'>;
  readonly left: Omit<Edge, 'path'>;
};

/** A sector about its point, with its right edge first. */
function sector(
  plan: GodetPlan,
  place: GodetPlace,
  { from, until, right, left }: Sector,
): Pick<Piece, 'edges' | 'notches' | 'darts' | 'levels' | 'drills' | 'grain' | 'side' | 'part'> {
  const radius = radiusOf(plan, place);
  const apex = point(0, 0);
  const rim = (angle: number): Point => point(radius * Math.sin(angle), radius * Math.cos(angle));
  const first: Edge = {
    ...right,
    path: [line(apex, rim(until))],
    corner: ((until - from) * 180) / Math.PI,
  };
  const last: Edge = { ...left, path: [line(rim(from), apex)] };
  const side = sideOf(place);
  const strokes = side === 'front' ? 1 : 2;
  const x = from === 0 || until === 0 ? 0.15 * radius * Math.tan((from + until) / 2) : 0;
  const sewn = (each: Edge): boolean =>
    each.name === 'near' || each.name === 'far' || each.name === 'seam';
  return {
    side,
    part: 'flare',
    edges: [first, edge('hem', 'hem', reverse(arc(apex, radius, from, until))), last],
    darts: [],
    levels: [],
    drills: [],
    notches: [
      ...(sewn(first) ? markOn(first, place, true, strokes) : []),
      ...(sewn(last) ? markOn(last, place, false, strokes) : []),
    ],
    grain: { from: point(x, 0.35 * radius), to: point(x, 0.85 * radius) },
  };
}

function godet(plan: GodetPlan, place: GodetPlace): readonly Piece[] {
  const half = plan.angle / 2;
  const slits = slitsOf(plan, place);
  const divided = isDivided(plan, place);
  const title = titles[place];
  const seam = (name: string, joins: EdgeRef): Omit<Edge, 'path'> => ({
    name,
    kind: name === 'middle' ? 'seam' : kindOf(place),
    joins,
  });
  if (place === 'centre-back') {
    const centre: Omit<Edge, 'path'> = divided
      ? { name: 'centre', kind: 'seam', joins: 'self' }
      : { name: 'centre', kind: 'fold' };
    return [
      {
        name: halfName(plan, place, 'far'),
        title,
        cut: divided ? 'cut 2 (a pair)' : 'cut 1 on fold',
        copies: divided ? 2 : 1,
        ...sector(plan, place, {
          from: 0,
          until: half,
          right: seam('seam', slits.far),
          left: centre,
        }),
      },
    ];
  }
  if (!divided) {
    return [
      {
        name: halfName(plan, place, 'near'),
        title,
        cut: 'cut 2',
        copies: 2,
        ...sector(plan, place, {
          from: -half,
          until: half,
          right: seam('far', slits.far),
          left: seam('near', slits.near),
        }),
      },
    ];
  }
  const [near, far] = [halfName(plan, place, 'near'), halfName(plan, place, 'far')];
  return [
    {
      name: near,
      title: `${title}, half ${place === 'side' ? 'to the front' : 'to the centre'}`,
      cut: 'cut 2 (a pair)',
      copies: 2,
      ...sector(plan, place, {
        from: -half,
        until: 0,
        right: seam('middle', to(far, 'middle')),
        left: seam('seam', slits.near),
      }),
    },
    {
      name: far,
      title: `${title}, half ${place === 'side' ? 'to the back' : 'to the side'}`,
      cut: 'cut 2 (a pair)',
      copies: 2,
      ...sector(plan, place, {
        from: 0,
        until: half,
        right: seam('seam', slits.far),
        left: seam('middle', to(near, 'middle')),
      }),
    },
  ];
}

/** The godets, each in a frame of its own with its point at the origin. */
export const godetPieces = (plan: GodetPlan): readonly Piece[] =>
  plan.places.flatMap((place) => godet(plan, place));

const spokenPlaces: { readonly [P in GodetPlace]: string } = {
  side: 'the side seams',
  'centre-back': 'the centre back',
  'front-princess': 'the front princess seams',
  'back-princess': 'the back princess seams',
};

const listed = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1) ?? ''}`;

/** Records how the godets were struck, and how they are set in. */
export function narrateGodets(
  paper: PartTable,
  plan: GodetPlan,
  hem: number,
  sweep: number,
  pieces: readonly Piece[],
): void {
  const { angle, depth, places, train } = plan;
  const count = godetCount(places);
  const divided = places.filter((place) => isDivided(plan, place));
  const longer =
    train > 0
      ? said` The one at the centre back is struck at ${mm(depth + train)}, the slit's length with the train.`
      : said``;
  const seamed =
    divided.length > 0
      ? said` Wider than the cloth at ${listed(divided.map((place) => spokenPlaces[place]))}: cut there in two halves.`
      : said``;
  paper.draw(
    'Godets',
    said`The hem is to be ${mm(hem)} all round, ${mm(sweep)} more than the knee and ${(hem / (hem - sweep)).toFixed(1)} times it: over ${count} godets of ${mm(depth)} that is ${mm(sweep / count)} of arc and ${deg((angle * 180) / Math.PI)} each. Strike a sector at ${mm(depth)} for ${listed(places.map((place) => spokenPlaces[place]))}.${longer}${seamed}`,
    {
      why: said`A godet's sides are as long as the slit and its grain runs down its middle, so its hem hangs level with the skirt's.`,
      lines: [arc(point(0, 0), depth, -angle / 2, angle / 2)],
      pieces: pieces.map(({ name }) => name),
    },
  );
  paper.draw(
    'Setting in the godets',
    said`Sew each seam down to the knee line and stop there exactly. Press a scrap of firm stay over the point, clip to it, and sew the godet from the point down, one side after the other.`,
    {
      why: said`All the strain of a stride comes to the point of a godet: unreinforced it tears first.`,
    },
  );
}
