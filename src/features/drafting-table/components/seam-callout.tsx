import { add, type Point } from '#shared/geometry/point.ts';

import type { Layout } from '../canvas/layout.ts';
import { toScreen, type Size, type View } from '../canvas/view.ts';
import type { LitSeam } from '../seams.ts';

type SeamCalloutProps = {
  readonly seam: LitSeam;
  readonly layout: Layout;
  readonly view: View;
  readonly size: Size;
};

/** Both lengths of the lit seam, under its two edges so that it hides neither. */
export const SeamCallout = ({ seam, layout, view, size }: SeamCalloutProps) => {
  const ends = seam.edges.flatMap((ref) => endsOf(ref, layout)).map((at) => toScreen(view, at));
  if (ends.length === 0) return null;
  const middle = ends.reduce((sum, { x }) => sum + x, 0) / ends.length;
  const low = Math.max(...ends.map(({ y }) => y)) + 14;
  const left = Math.min(Math.max(middle - 120, 34), Math.max(34, size.width - 250));
  const top = Math.min(Math.max(low, 34), Math.max(34, size.height - 120));
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

function endsOf(ref: LitSeam['edges'][number], layout: Layout): Point[] {
  const placed = layout.placed.find(({ piece }) => piece.name === ref.piece);
  const edge = placed?.piece.edges.find(({ name }) => name === ref.edge);
  if (placed === undefined || edge === undefined) return [];
  return edge.path.flatMap(({ from, to }) => [add(from, placed.at), add(to, placed.at)]);
}
