import { add } from '#shared/geometry/point.ts';
import { pathLength, stationAtLength } from '#shared/geometry/curve.ts';

import type { Layout } from '../canvas/layout.ts';
import { toScreen, type Size, type View } from '../canvas/view.ts';
import type { LitSeam } from '../seams.ts';

type SeamCalloutProps = {
  readonly seam: LitSeam;
  readonly layout: Layout;
  readonly view: View;
  readonly size: Size;
};

/** Both lengths of the lit seam, beside the middle of its first edge. */
export const SeamCallout = ({ seam, layout, view, size }: SeamCalloutProps) => {
  const first = seam.edges[0];
  const placed = layout.placed.find(({ piece }) => piece.name === first?.piece);
  const edge = placed?.piece.edges.find(({ name }) => name === first?.edge);
  if (placed === undefined || edge === undefined) return null;
  const middle = stationAtLength(edge.path, pathLength(edge.path) / 2);
  if (middle === undefined) return null;
  const at = toScreen(view, add(middle.at, placed.at));
  const left = Math.min(Math.max(at.x + 14, 34), Math.max(34, size.width - 250));
  const top = Math.min(Math.max(at.y - 24, 34), Math.max(34, size.height - 110));
  return (
    <div
      aria-hidden="true"
      className="figures pointer-events-none absolute max-w-60 rounded-one bg-ink px-3 py-1 text-sm text-ground"
      style={{ left, top }}
    >
      <p className="font-semibold">{seam.title}</p>
      {seam.lines.map((line) => (
        <p key={line}>{line}</p>
      ))}
    </div>
  );
};
