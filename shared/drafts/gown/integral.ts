import { edge } from '../../drafting/outline.ts';
import type { Piece } from '../../drafting/piece.ts';
import { pathLength, reverse } from '../../geometry/curve.ts';
import { type Path, cubic, line } from '../../geometry/path.ts';
import { type Point, between, point, scale } from '../../geometry/point.ts';
import { type Profile, profilePath, xAt } from '../../geometry/profile.ts';
import type { PanelFoot } from './skirt-foot.ts';
import type { SkirtPanel } from './skirt-panel.ts';
import { type HemPlace, fallingHem, trainShare, trainedHem } from './train.ts';

/** Part of the depth over which a seam turns outwards below the knee line; then it runs straight (our rule). */
const turning = 0.4;

/** Farthest a seam may lean out below the knee line, 25 degrees (our rule): more would stand off in points. */
const farthestLean = Math.tan((25 * Math.PI) / 180);

/** A skirt whose seams run on outwards below the knee line. */
export type IntegralPlan = {
  readonly depth: number;
  readonly train: number;
  /** Lean (dx/dy) of the straight part of every seam that runs outwards. */
  readonly lean: number;
  /** Panels of each half, from the centre out. */
  readonly panels: readonly SkirtPanel[];
};

/** Distance from the upright at a height below the knee line. */
const runOut = (lean: number, depth: number): Profile => {
  const turn = turning * depth;
  return [
    { from: 0, to: turn, a: 0, b: 0, c: lean / (2 * turn), d: 0 },
    { from: turn, to: Infinity, a: (lean * turn) / 2, b: lean, c: 0, d: 0 },
  ];
};

/** Height under the knee line at which a seam that runs out so is `length` long, mm. */
function heightAtLength(lean: number, depth: number, length: number): number {
  if (lean === 0) return length;
  const turn = turning * depth;
  const slant = Math.hypot(1, lean);
  const turned = (turn / (2 * lean)) * (lean * slant + Math.asinh(lean));
  return turn + (length - turned) / slant;
}

/** Whether an edge of a panel runs outwards: all but the centre front, which stays on the fold. */
const runsOut = ({ side, inner }: SkirtPanel, at: 'inner' | 'outer'): boolean =>
  at === 'outer' || inner === 'princess' || side === 'back';

/** Where an edge of a panel ends when it is `length` long below the knee line. */
function endAt(
  plan: IntegralPlan,
  panel: SkirtPanel,
  at: 'inner' | 'outer',
  length: number,
): Point {
  if (!runsOut(panel, at)) return point(panel.from, panel.knee + length);
  const y = heightAtLength(plan.lean, plan.depth, length);
  const out = xAt(runOut(plan.lean, plan.depth), y);
  return at === 'outer'
    ? point(panel.until + out, panel.knee + y)
    : point(panel.from - out, panel.knee + y);
}

/** From level at one place to square across a leaning seam: the corner of both directions, a third off. */
function risingTo(flat: Point, end: Point, lean: number): Path {
  const towards = Math.sign(end.x - flat.x);
  const corner = point(end.x - (towards * (flat.y - end.y)) / lean, flat.y);
  return [cubic(flat, between(flat, corner, 2 / 3), between(end, corner, 2 / 3), end)];
}

/** The level hem of a panel from its inner to its outer edge: flat in its middle, square to its seams. */
function levelHem(plan: IntegralPlan, panel: SkirtPanel): Path {
  const [inner, outer] = (['inner', 'outer'] as const).map((at) =>
    endAt(plan, panel, at, plan.depth),
  );
  if (!inner || !outer) return [];
  if (!runsOut(panel, 'inner')) return risingTo(inner, outer, plan.lean);
  const middle = point((panel.from + panel.until) / 2, panel.knee + plan.depth);
  return [...reverse(risingTo(middle, inner, plan.lean)), ...risingTo(middle, outer, plan.lean)];
}

/** Seam edges of a half that run outwards. */
export const edgesRunningOut = (panels: readonly SkirtPanel[]): number =>
  panels.reduce((sum, panel) => sum + 1 + (runsOut(panel, 'inner') ? 1 : 0), 0);

/** Widest hem seams can make that lean out as far as they may, mm all round: so many edges in half the gown. */
export const widestIntegral = (knee: number, depth: number, edges: number): number =>
  knee + 2 * edges * xAt(runOut(farthestLean, depth), heightAtLength(farthestLean, depth, depth));

/**
 * Gives the seams of both halves the lean at which the level hem is `hemSweep` long all round. Seams that
 * are sewn together run out alike, so they stay equal.
 */
export function planIntegral(
  panels: readonly SkirtPanel[],
  {
    depth,
    train,
    hemSweep,
  }: { readonly depth: number; readonly train: number; readonly hemSweep: number },
): IntegralPlan {
  const planAt = (lean: number): IntegralPlan => ({ depth, train, lean, panels });
  const sweepAt = (lean: number): number => {
    const plan = planAt(lean);
    return 2 * panels.reduce((sum, panel) => sum + pathLength(levelHem(plan, panel)), 0);
  };
  let [low, high] = [1e-4, 1];
  for (let i = 0; i < 40; i += 1) {
    const lean = (low + high) / 2;
    if (sweepAt(lean) < hemSweep) low = lean;
    else high = lean;
  }
  return planAt((low + high) / 2);
}

/** Length of a seam below the knee line, at an end of a panel's hem: longer where the train begins. */
type Reach = { readonly inner: number; readonly outer: number };

/** The hem of a panel and how long the seams at its ends are, with its part of the train in the back. */
function hemOf(
  plan: IntegralPlan,
  panel: SkirtPanel,
): { readonly hem: Path; readonly reach: Reach } {
  const own = levelHem(plan, panel);
  if (plan.train === 0 || panel.side === 'front')
    return { hem: own, reach: { inner: plan.depth, outer: plan.depth } };
  const half = plan.panels.filter(({ side }) => side === panel.side);
  const lengths = half.map((each) => pathLength(levelHem(plan, each)));
  const whole = lengths.reduce((sum, length) => sum + length, 0);
  const index = half.findIndex(({ piece }) => piece === panel.piece);
  const before = lengths.slice(0, index).reduce((sum, length) => sum + length, 0);
  const length = lengths[index] ?? 0;
  const most = Math.atan(plan.lean);
  const places = fallingHem(own, runsOut(panel, 'inner') ? -most : 0, most);
  const part = whole / length;
  const level = (share: number): HemPlace => {
    const within = Math.min(1, Math.max(0, share * part - before / length));
    const { at, along, fall, turn } = places(within);
    return { at, along: scale(along, part), fall, turn: turn * part };
  };
  const [from, until] = [before / whole, (before + length) / whole];
  return {
    hem: trainedHem(level, plan.train, from, until),
    reach: {
      inner: plan.depth + plan.train * trainShare(from),
      outer: plan.depth + plan.train * trainShare(until),
    },
  };
}

/** The outward run of a seam from the knee line down, `length` long. */
function seamRun(
  plan: IntegralPlan,
  { knee }: SkirtPanel,
  x: number,
  towards: 1 | -1,
  length: number,
): Path {
  const y = heightAtLength(plan.lean, plan.depth, length);
  const profile = runOut(plan.lean, plan.depth).map((piece) => ({
    from: knee + piece.from,
    to: knee + piece.to,
    a: x + towards * piece.a,
    b: towards * piece.b,
    c: towards * piece.c,
    d: 0,
  }));
  return profilePath(profile, knee, knee + y);
}

/** Marks on the seams of a panel where they leave the upright, at the knee line. */
function kneeMarks(panel: SkirtPanel): Piece['notches'] {
  const mark = (edge: string, x: number, outward: 1 | -1): Piece['notches'][number] => ({
    name: 'knee',
    edge,
    at: point(x, panel.knee),
    outward: point(outward, 0),
    strokes: panel.side === 'front' ? 1 : 2,
  });
  return [
    mark(panel.outer, panel.until, 1),
    ...(runsOut(panel, 'inner') ? [mark(panel.inner, panel.from, -1)] : []),
  ];
}

/** A panel whose seams run on outwards from the knee line to a hem that is square to them. */
export function integralFoot(plan: IntegralPlan, panel: SkirtPanel): PanelFoot {
  const { hem, reach } = hemOf(plan, panel);
  const inner = runsOut(panel, 'inner')
    ? seamRun(plan, panel, panel.from, -1, reach.inner)
    : [line(point(panel.from, panel.knee), point(panel.from, panel.knee + reach.inner))];
  return {
    outer: seamRun(plan, panel, panel.until, 1, reach.outer),
    edges: [edge('hem', 'hem', reverse(hem))],
    inner: reverse(inner),
    notches: kneeMarks(panel),
  };
}
