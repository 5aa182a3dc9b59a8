import type { LevelName } from '#shared/drafting/piece.ts';
import type { Step } from '#shared/drafting/step.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { line, type Path } from '#shared/geometry/path.ts';
import type { Finding } from '#shared/proof/proof.ts';
import type { Point } from '#shared/geometry/point.ts';

import type { LitSeam } from '../seams.ts';
import type { Layout, Placed } from './layout.ts';
import type { Lit } from './sheet.ts';

/** The frames a step's points and lines stand in. */
export const framesOf = (step: Step, layout: Layout): readonly Point[] =>
  step.side === 'both' ? [layout.frames.front, layout.frames.back] : [layout.frames[step.side]];

/** What stands out on the drawing now. */
export function litLines(
  draft: Drafted,
  layout: Layout,
  seam: LitSeam | undefined,
  step: Step | undefined,
  looked: Finding['where'] = [],
): Lit {
  const faults = draft.proof.lines
    .flatMap((line) => line.findings)
    .filter((finding) => !finding.holds)
    .flatMap((finding) => finding.where)
    .flatMap(({ piece, edge }) => (edge === undefined ? [] : [{ piece, edge }]));
  return {
    seams: seam?.edges ?? [],
    faults,
    lines: [
      ...(step === undefined ? [] : stepLines(step, layout)),
      ...looked.flatMap((place) => placeLines(place, layout)),
    ],
  };
}

/** Half the width of the cross at a place the proof looked at, mm. */
const cross = 12;

/** A place the proof looked at: the point itself, or its edge, or the whole piece. */
function placeLines({ piece, edge, at }: Finding['where'][number], layout: Layout): Lit['lines'] {
  const placed = layout.placed.find((each) => each.piece.name === piece);
  if (placed === undefined) return [];
  const edges = placed.piece.edges.filter(({ name }) => name === edge);
  const paths = at === undefined && edges.length === 0 ? [placed.piece.cutLine] : [];
  const point = at === undefined ? [] : [crossAt(at)];
  return [...edges.map(({ path }) => path), ...paths, ...point.flat()].map((path) => ({
    path,
    at: placed.at,
  }));
}

const crossAt = ({ x, y }: Point): readonly Path[] => [
  [line({ x: x - cross, y: y - cross }, { x: x + cross, y: y + cross })],
  [line({ x: x - cross, y: y + cross }, { x: x + cross, y: y - cross })],
];

/** The level a girth is taken at, or a height leads to. */
const levelOf: Readonly<Record<string, LevelName>> = {
  upperChestGirth: 'chest',
  bustGirth: 'bust',
  underbustGirth: 'underbust',
  waistSeamGirth: 'waist-seam',
  waistGirth: 'waist',
  topHipGirth: 'top-hip',
  hipGirth: 'hip',
};

/**
 * What a step drew. The gores of a flare lie apart and not in the frame they were struck in, so their own edges
 * stand for the arcs; a step that drew nothing lights the levels its measures belong to, or else its pieces.
 */
function stepLines(step: Step, layout: Layout): Lit['lines'] {
  if (step.side === 'flare') return flareLines(step, layout);
  if (step.lines.length > 0 || Object.keys(step.points).length > 0) {
    return framesOf(step, layout).flatMap((at) => step.lines.map((path) => ({ path, at })));
  }
  const own = layout.placed.filter(({ piece }) => step.side === 'both' || piece.side === step.side);
  const concerned = step.measures.map((measure) => levelOf[measure]);
  const levels = own.flatMap(({ piece, at }) =>
    piece.levels
      .filter(({ level }) => concerned.includes(level))
      .map(({ from, to }) => ({ path: [line(from, to)], at })),
  );
  return levels.length > 0 ? levels : own.map(({ piece, at }) => ({ path: piece.cutLine, at }));
}

/** Knee edges and hems of the gores of the side a step struck; the knee alone where it only speaks of it. */
function flareLines(step: Step, { placed }: Layout): Lit['lines'] {
  const struck = step.lines.length > 0;
  const edgesOf = ({ piece, at }: Placed): { path: Path; at: Point }[] =>
    piece.edges
      .filter(({ name }) => name.startsWith('knee') || (struck && name === 'hem'))
      .map(({ path }) => ({ path, at }));
  return placed
    .filter(({ piece }) => piece.part === 'flare' && (!struck || step.id.endsWith(piece.side)))
    .flatMap(edgesOf);
}
