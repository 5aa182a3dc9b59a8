import type { Layout } from '../canvas/layout.ts';
import { toScreen, type View } from '../canvas/view.ts';

type HeldPieceProps = {
  readonly piece: string | undefined;
  readonly layout: Layout;
  readonly view: View;
};

/** A brass frame round the piece that is being moved. */
export const HeldPiece = ({ piece, layout, view }: HeldPieceProps) => {
  const box = layout.placed.find((each) => each.piece.name === piece)?.box;
  if (box === undefined) return null;
  const from = toScreen(view, { x: box.left, y: box.top });
  return (
    <rect
      aria-hidden="true"
      x={from.x - 4}
      y={from.y - 4}
      width={(box.right - box.left) * view.scale + 8}
      height={(box.bottom - box.top) * view.scale + 8}
      strokeWidth={1.5}
      strokeDasharray="8 4"
      className="fill-none stroke-brass"
    />
  );
};
