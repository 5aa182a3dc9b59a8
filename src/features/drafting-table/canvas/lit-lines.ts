import type { LevelName } from '#shared/drafting/piece.ts';
import type { Step } from '#shared/drafting/step.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { line, type Path } from '#shared/geometry/path.ts';
import type { Point } from '#shared/geometry/point.ts';

import type { LitSeam } from '../seams.ts';
import type { Layout, Placed } from './layout.ts';
import type { Lit } from './sheet.ts';

/** The frames a step's points and lines stand in. */
export const framesOf = (step: Step, layout: Layout): readonly Point[] =>
  step.side === 'both' ? [layout.frames.front, layout.frames.back] : [layout.frames[step.side]];

/** What stands out on the drawing now. */
export function litLines(
  draft: Draft,
  layout: Layout,
  seam: LitSeam | undefined,
  step: Step | undefined,
): Lit {
  const faults = draft.proof.lines
    .flatMap((line) => line.findings)
    .filter((finding) => !finding.holds)
    .flatMap((finding) => finding.where)
    .flatMap(({ piece, edge }) => (edge === undefined ? [] : [{ piece, edge }]));
  return {
    seams: seam?.edges ?? [],
    faults,
    lines: step === undefined ? [] : stepLines(step, layout),
  };
}

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
