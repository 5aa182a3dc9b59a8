import type { Step } from '#shared/drafting/step.ts';
import type { Draft } from '#shared/engine/draft.ts';
import type { Point } from '#shared/geometry/point.ts';

import type { LitSeam } from '../seams.ts';
import type { Layout } from './layout.ts';
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
  const lines =
    step === undefined
      ? []
      : framesOf(step, layout).flatMap((at) => step.lines.map((path) => ({ path, at })));
  return { seams: seam?.edges ?? [], faults, lines };
}
