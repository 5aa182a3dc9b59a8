import { edge, notchAtLength, to } from '../../drafting/outline.ts';
import type { Edge, Piece } from '../../drafting/piece.ts';
import { pathLength, reverse } from '../../geometry/curve.ts';
import { type Path, line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import type { PanelFoot } from './skirt-foot.ts';
import type { SkirtPanel } from './skirt-panel.ts';
import { trainShare, trainedHem } from './train.ts';

/** Seams a godet is set into. */
export type GodetPlace = 'side' | 'centre-back' | 'front-princess' | 'back-princess';

/** A godet is at most a quarter circle (our rule): a wider one swings to a point. */
export const widestGodet = Math.PI / 2;

/** How often each is cut. */
const howMany: { readonly [P in GodetPlace]: number } = {
  side: 2,
  'centre-back': 1,
  'front-princess': 2,
  'back-princess': 2,
};

/**
 * Where godets are set in: the side seams, the centre back and, where the shaping has princess seams down to the
 * knee, these too. The back's stay plain where a train's hem falls across them.
 */
export const godetPlaces = (princess: boolean, train: number): readonly GodetPlace[] => [
  'side',
  'centre-back',
  ...(princess ? (['front-princess'] as const) : []),
  ...(princess && train === 0 ? (['back-princess'] as const) : []),
];

/** Godets in the whole skirt. */
export const godetCount = (places: readonly GodetPlace[]): number =>
  places.reduce((sum, place) => sum + howMany[place], 0);

/**
 * Angle of each of `count` godets that add `sweep` to a hem, radians: sweep over count times radius.
 * Source: the arc of a circle; common practice (`reference.md` 3f), check values in `tests/outside`.
 */
export const godetAngle = (sweep: number, count: number, radius: number): number =>
  sweep / (count * radius);

/** A skirt that runs on upright below the knee line with sectors of a circle set into its seams. */
export type GodetPlan = {
  /** Radius of the godets, and length of the slits: knee line to hem. */
  readonly depth: number;
  readonly train: number;
  readonly angle: number;
  readonly places: readonly GodetPlace[];
  /** Usable width of cloth for a piece between its seam lines: a wider godet is cut in two. */
  readonly room: number;
  /** Panels of both halves, from the centre out. */
  readonly panels: readonly SkirtPanel[];
};

/** A godet in a side seam may be let out as far as the seam above it. */
export const kindOf = (place: GodetPlace): 'side' | 'seam' => (place === 'side' ? 'side' : 'seam');

/** The godet in an edge of a panel; none in the centre front, or where none is asked for. */
function placeOf(
  { places }: GodetPlan,
  { side, inner, outer }: SkirtPanel,
  at: 'inner' | 'outer',
): GodetPlace | undefined {
  const seam = at === 'outer' ? outer : inner;
  const place: GodetPlace =
    seam === 'side' ? 'side' : seam === 'princess' ? `${side}-princess` : 'centre-back';
  if (place === 'centre-back' && side === 'front') return undefined;
  return places.includes(place) ? place : undefined;
}

/** Length of a slit or seam below the knee line at a distance from the centre. */
function lengthAt(plan: GodetPlan, panel: SkirtPanel, x: number): number {
  if (plan.train === 0 || panel.side === 'front') return plan.depth;
  return plan.depth + plan.train * trainShare(x / quarterOf(plan, panel));
}

const quarterOf = ({ panels }: GodetPlan, { side }: SkirtPanel): number =>
  Math.max(...panels.filter((each) => each.side === side).map(({ until }) => until));

/** The hem of a panel, outwards: level, or falling to the train at the centre back. */
function hemOf(plan: GodetPlan, panel: SkirtPanel): Path {
  const y = panel.knee + plan.depth;
  if (plan.train === 0 || panel.side === 'front')
    return [line(point(panel.from, y), point(panel.until, y))];
  const quarter = quarterOf(plan, panel);
  return trainedHem(
    (share) => ({ at: point(share * quarter, y), along: point(quarter, 0), fall: 0, turn: 0 }),
    plan.train,
    panel.from / quarter,
    panel.until / quarter,
  );
}

/** Heights of the marks on each godet's seams, as a part of their length: godets cannot be exchanged. */
const markedAt: { readonly [P in GodetPlace]: number } = {
  side: 0.5,
  'centre-back': 0.4,
  'front-princess': 0.6,
  'back-princess': 0.35,
};

/** The marks on a seam of a godet: at its point, where the seam above it stops, and one down it, alike on both edges. */
export function markOn(
  seam: Edge,
  place: GodetPlace,
  downwards: boolean,
  strokes: 1 | 2,
): Piece['notches'] {
  const length = pathLength(seam.path);
  const down = length * markedAt[place];
  return [
    ...notchAtLength(`godet-${place}-point`, seam, downwards ? 0 : length, strokes),
    ...notchAtLength(`godet-${place}`, seam, downwards ? down : length - down, strokes),
  ];
}

/** Which piece a seam of a godet is found on: divided godets have one for each of their seams. */
export const halfName = (plan: GodetPlan, place: GodetPlace, towards: 'near' | 'far'): string =>
  isDivided(plan, place) && place !== 'centre-back'
    ? `godet-${place}-${towards === 'near' ? 'a' : 'b'}`
    : `godet-${place}`;

export const radiusOf = (plan: GodetPlan, place: GodetPlace): number =>
  plan.depth + (place === 'centre-back' ? plan.train : 0);

/** Radii of all the godets of the skirt, added: times their angle it is the length of their hems, mm. */
export const sumOfRadii = (plan: GodetPlan): number =>
  plan.places.reduce((sum, place) => sum + howMany[place] * radiusOf(plan, place), 0);

/** Whether a godet is wider than the cloth and gets a seam down its middle. */
export const isDivided = (plan: GodetPlan, place: GodetPlace): boolean =>
  2 * radiusOf(plan, place) * Math.sin(plan.angle / 2) > plan.room;

/** Widest angle whose half still fits the cloth, radians; a quarter circle at most. */
export const widestAngle = (radius: number, room: number): number =>
  Math.min(widestGodet, 2 * Math.asin(Math.min(1, room / radius)));

/**
 * A panel that runs on upright to the hem. Its seams are left open below the knee line for godets; the edge from the
 * centre out comes first on the godet (`near`), the other after it (`far`).
 */
export function godetFoot(plan: GodetPlan, panel: SkirtPanel): PanelFoot {
  const { knee } = panel;
  const strokes = panel.side === 'front' ? 1 : 2;
  const foot = (x: number): Point => point(x, knee + lengthAt(plan, panel, x));
  const down = (x: number): Path => [line(point(x, knee), foot(x))];
  const [outer, inner] = [placeOf(plan, panel, 'outer'), placeOf(plan, panel, 'inner')];
  const open: Edge[] = outer
    ? [
        {
          ...edge(
            `godet-${panel.outer}`,
            kindOf(outer),
            down(panel.until),
            slitPartner(plan, panel, outer, 'outer'),
          ),
          corner: 180,
        },
      ]
    : [];
  const closing: Edge[] = inner
    ? [
        edge(
          `godet-${panel.inner}`,
          kindOf(inner),
          reverse(down(panel.from)),
          slitPartner(plan, panel, inner, 'inner'),
        ),
      ]
    : [];
  return {
    outer: outer ? [] : down(panel.until),
    edges: [...open, edge('hem', 'hem', reverse(hemOf(plan, panel))), ...closing],
    inner: inner ? [] : reverse(down(panel.from)),
    ...(inner ? { innerCorner: 180 } : {}),
    notches: [
      ...open.flatMap((seam) => (outer ? markOn(seam, outer, true, strokes) : [])),
      ...closing.flatMap((seam) => (inner ? markOn(seam, inner, false, strokes) : [])),
    ],
  };
}

/** The edge of a godet that an open edge of a panel is sewn to. */
function slitPartner(
  plan: GodetPlan,
  { side }: SkirtPanel,
  place: GodetPlace,
  at: 'inner' | 'outer',
): { readonly piece: string; readonly edge: string } {
  if (place === 'centre-back') return to(halfName(plan, place, 'far'), 'seam');
  // Seen from outside the front lies before the godet, the back after it; so do centre and side panel.
  const near = place === 'side' ? side === 'front' : at === 'outer';
  const towards = near ? 'near' : 'far';
  return to(halfName(plan, place, towards), isDivided(plan, place) ? 'seam' : towards);
}
