import type { Step } from '#shared/drafting/step.ts';
import { add } from '#shared/geometry/point.ts';

import type { Layout } from './layout.ts';
import { framesOf } from './lit-lines.ts';
import { toScreen, type View } from './view.ts';

type StepPointsProps = { readonly step: Step; readonly layout: Layout; readonly view: View };

/** The named points that the chosen step fixed. */
export const StepPoints = ({ step, layout, view }: StepPointsProps) => (
  <g aria-hidden="true">
    {framesOf(step, layout).map((frame, index) =>
      Object.entries(step.points).map(([name, point]) => {
        const at = toScreen(view, add(point, frame));
        return (
          <g key={`${name} ${index}`} transform={`translate(${at.x} ${at.y})`}>
            <circle r={4} className="fill-brass" />
            <text x={8} y={-6} className="halo fill-brass text-[0.8125rem] font-semibold">
              {name.replaceAll('-', ' ')}
            </text>
          </g>
        );
      }),
    )}
  </g>
);
